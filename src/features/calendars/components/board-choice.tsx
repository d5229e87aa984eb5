import { useTranslation } from 'react-i18next';
import { boardTiming, safetySideOf } from '#shared/calendar/variants.js';
import type { Variant } from '#shared/contracts/variants.js';
import { useEntryWords } from '#src/lib/entry-words.js';
import { useWriterWords } from '#src/lib/giver-words.js';
import { TextField } from '#src/ui/field.js';
import { PickGroup } from '#src/ui/pick.js';
import { Care } from '#src/ui/surfaces.js';
import type { FormState } from '../model/form-state.js';

type Board = NonNullable<FormState['draft']['board']>;

/** Which timing the board goes by. Where somebody could be hurt nobody chooses; what is safe for all is said instead. */
export function BoardChoice({ form, variants }: { form: FormState; variants: readonly Variant[] }) {
  const { t } = useTranslation('variants');
  const words = useEntryWords();
  const writer = useWriterWords();
  const { draft, content, dates, change, at } = form;
  const timings = variants.filter((variant) => variant.content.difference !== 'not-on-a-board');
  const side = safetySideOf(content);
  if (timings.length === 0) return null;
  if (side !== null) {
    const { window } = boardTiming(
      { ...content, window: dates?.window ?? null },
      timings.map((one) => ({ variantId: one.variantId, isObjection: false, window: one.dates.window })),
      null,
    );
    return (
      <Care>
        <p>{t(side === 'narrow' ? 'board.narrow' : 'board.wide')}</p>
        <p>{window ? t('board.days', { days: words.windowSentence(window) }) : t('board.noDays')}</p>
      </Care>
    );
  }
  const board: Board = draft.board ?? { shows: 'entry', variantId: null, reason: '' };
  const value = board.shows === 'variant' ? (board.variantId ?? 'entry') : board.shows;
  return (
    <div className="grid gap-3">
      <PickGroup
        label={t('board.title')}
        stacked
        value={value}
        onChange={(next) => {
          const isVariant = next !== 'entry' && next !== 'both';
          change({
            board: {
              shows: isVariant ? 'variant' : next,
              variantId: isVariant ? next : null,
              reason: board.reason,
            },
          });
        }}
        options={[
          { value: 'entry', label: t('board.entry.name'), note: t('board.entry.note') },
          ...timings.map((one) => ({
            value: one.variantId,
            label: t('board.variant', { giver: writer(one.content.giver) }),
          })),
          { value: 'both', label: t('board.both.name'), note: t('board.both.note') },
        ]}
      />
      {draft.board !== undefined && (
        <TextField
          label={t('board.reason')}
          hint={t('board.reasonHint')}
          value={board.reason}
          problem={at('board.reason')}
          onChange={(event) => {
            change({ board: { ...board, reason: event.currentTarget.value } });
          }}
        />
      )}
    </div>
  );
}

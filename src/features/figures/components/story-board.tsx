import { Plus, X } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { FIGURE_STORY_MAX, FIGURE_VARIANT_MAX, FIGURE_VARIANTS_MAX } from '#shared/contracts/figures.js';
import { Button } from '#src/ui/button.js';
import { TextAreaField, TextField } from '#src/ui/field.js';
import { SHARING_LEVELS } from '#shared/contracts/sharing.js';
import { SharingFields } from '#src/lib/sharing-fields.js';
import { PickGroup } from '#src/ui/pick.js';
import { Board, Well } from '#src/ui/surfaces.js';
import { narrower } from '../model/figure-draft.js';
import type { FigurePart } from './figure-form-parts.js';

/** The story as the village tells it, other tellings beside it, and who may read them. */
export function StoryBoard({ draft, change, problem, tag }: FigurePart & { tag: string }) {
  const { t } = useTranslation(['figures', 'sharing']);
  const setVariant = (index: number, patch: { toldBy?: string; text?: string }) => {
    change({ variants: draft.variants.map((row, at) => (at === index ? { ...row, ...patch } : row)) });
  };
  return (
    <Board title={t('form.story')}>
      <div className="grid gap-4">
        {!draft.storyShown && <p className="text-small text-umber-soft">{t('form.storyKept')}</p>}
        <TextAreaField
          id="figure-story"
          label={t('form.storyLabel')}
          hint={t('form.storyHint')}
          rows={6}
          lang={tag}
          maxLength={FIGURE_STORY_MAX}
          value={draft.story}
          disabled={!draft.storyShown}
          problem={problem('story')}
          onChange={(event) => {
            change({ story: event.currentTarget.value });
          }}
        />
        {draft.variants.map(({ toldBy, text }, index) => (
          <Well key={index} className="grid gap-3">
            <TextField
              label={t('form.toldBy')}
              hint={t('form.toldByHint')}
              value={toldBy}
              maxLength={80}
              autoComplete="off"
              onChange={(event) => {
                setVariant(index, { toldBy: event.currentTarget.value });
              }}
            />
            <TextAreaField
              id={`figure-variants.${index}`}
              label={t('form.variant')}
              rows={4}
              lang={tag}
              maxLength={FIGURE_VARIANT_MAX}
              value={text}
              problem={problem(`variants.${index}`)}
              onChange={(event) => {
                setVariant(index, { text: event.currentTarget.value });
              }}
            />
            <div>
              <Button
                look="quiet"
                icon={<X aria-hidden size={20} />}
                onClick={() => {
                  change({ variants: draft.variants.filter((_, at) => at !== index) });
                }}
              >
                {t('form.variantOut')}
              </Button>
            </div>
          </Well>
        ))}
        {draft.variants.length < FIGURE_VARIANTS_MAX && (
          <div>
            <Button
              look="quiet"
              icon={<Plus aria-hidden size={20} />}
              onClick={() => {
                change({ variants: [...draft.variants, { toldBy: '', text: '' }] });
              }}
            >
              {t('form.variantMore')}
            </Button>
          </div>
        )}
        <SharingFields
          value={{ level: draft.sharingLevel, details: draft.sharing }}
          problem={(field) => problem(field === 'level' ? 'sharingLevel' : `sharing.${field}`)}
          onChange={({ level, details }) => {
            change({ sharingLevel: level, sharing: details, storyLevel: narrower(level, draft.storyLevel) });
          }}
        />
        {draft.storyShown && (
          <PickGroup
            label={t('form.storyLevel')}
            hint={t('form.storyLevelHint')}
            stacked
            value={draft.storyLevel}
            problem={problem('storyLevel')}
            onChange={(storyLevel) => {
              change({ storyLevel });
            }}
            options={SHARING_LEVELS.slice(SHARING_LEVELS.indexOf(draft.sharingLevel)).map((level) => ({
              value: level,
              label: t(`sharing:level.${level}.name`),
            }))}
          />
        )}
      </div>
    </Board>
  );
}

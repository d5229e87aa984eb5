import { useTranslation } from 'react-i18next';
import { TextField, TickField } from '#src/ui/field.js';
import { Board } from '#src/ui/surfaces.js';
import type { FigurePart } from './figure-form-parts.js';

/** How deep the Sun must be for this figure, where the village knows better than its brightness says. */
export function DepthsBoard({ draft, change, problem }: FigurePart) {
  const { t } = useTranslation('figures');
  return (
    <Board title={t('form.depths')}>
      <div className="grid gap-4">
        <p className="text-small text-umber-soft">{t('form.depthsLead')}</p>
        <TickField
          label={t('form.hasOwnDepths')}
          checked={draft.hasOwnDepths}
          onChange={(event) => {
            change({ hasOwnDepths: event.currentTarget.checked });
          }}
        />
        {draft.hasOwnDepths && (
          <div className="grid gap-4 mid:grid-cols-2">
            <TextField
              id="figure-ownDepths.sameSideDeg"
              label={t('form.sameSide')}
              hint={t('form.sameSideHint')}
              inputMode="decimal"
              dir="ltr"
              value={draft.sameSide}
              problem={problem('ownDepths.sameSideDeg')}
              onChange={(event) => {
                change({ sameSide: event.currentTarget.value });
              }}
            />
            <TextField
              id="figure-ownDepths.oppositeSideDeg"
              label={t('form.oppositeSide')}
              hint={t('form.oppositeSideHint')}
              inputMode="decimal"
              dir="ltr"
              value={draft.oppositeSide}
              problem={problem('ownDepths.oppositeSideDeg')}
              onChange={(event) => {
                change({ oppositeSide: event.currentTarget.value });
              }}
            />
          </div>
        )}
      </div>
    </Board>
  );
}

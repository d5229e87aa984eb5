import { useTranslation } from 'react-i18next';
import { PATCH_CLASSES } from '#shared/sky/vocabulary.js';
import { TextField } from '#src/ui/field.js';
import { PickGroup } from '#src/ui/pick.js';
import type { FigurePart } from './figure-form-parts.js';

/** Where a patch of sky is, and how dark the night must be for it. */
export function PatchFields({ draft, change, problem, onPlaced }: FigurePart & { onPlaced: () => void }) {
  const { t } = useTranslation('figures');
  return (
    <div className="grid gap-4">
      <div className="grid gap-4 mid:grid-cols-2">
        <TextField
          id="figure-patch.rightAscensionDeg"
          label={t('form.rightAscension')}
          hint={t('form.rightAscensionHint')}
          value={draft.rightAscension}
          problem={problem('patch.rightAscensionDeg')}
          autoComplete="off"
          dir="ltr"
          onChange={(event) => {
            change({ rightAscension: event.currentTarget.value });
          }}
          onBlur={onPlaced}
        />
        <TextField
          id="figure-patch.declinationDeg"
          label={t('form.declination')}
          hint={t('form.declinationHint')}
          value={draft.declination}
          problem={problem('patch.declinationDeg')}
          autoComplete="off"
          dir="ltr"
          onChange={(event) => {
            change({ declination: event.currentTarget.value });
          }}
          onBlur={onPlaced}
        />
      </div>
      <PickGroup
        label={t('form.patchClass')}
        stacked
        value={draft.patchClass}
        onChange={(patchClass) => {
          change({ patchClass });
        }}
        options={PATCH_CLASSES.map((one) => ({
          value: one,
          label: t(`patchClass.${one}.name`),
          note: t(`patchClass.${one}.note`),
        }))}
      />
    </div>
  );
}

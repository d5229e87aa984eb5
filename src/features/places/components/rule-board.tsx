import { useTranslation } from 'react-i18next';
import { THRESHOLD_SETS, type SkylineRule } from '#shared/sky/vocabulary.js';
import { Fold } from '#src/ui/fold.js';
import { PickGroup } from '#src/ui/pick.js';
import { Stepper } from '#src/ui/stepper.js';
import { Board } from '#src/ui/surfaces.js';
import { signedDegreesText } from '../model/degrees.js';
import type { FieldPart } from './place-form-parts.js';

const SHIFT_MAX_DEG = 6;
/** The usual choice first. */
const SKYLINE_RULES: readonly SkylineRule[] = ['altitude-difference', 'depth-at-crossing'];

/** How deep the Sun must be: the rule, the two shifts of the place, and how hills count. Each with its source. */
export function RuleBoard({ draft, change }: FieldPart) {
  const { t, i18n } = useTranslation('places');
  const degrees = (value: number) =>
    value === 0 ? t('rule.noShift') : t('rule.shift', { degrees: signedDegreesText(value, i18n.language) });
  return (
    <Board title={t('rule.title')}>
      <p className="mb-3 text-small text-umber-soft">{t('rule.trade')}</p>
      <PickGroup
        label={t('rule.pick')}
        stacked
        value={draft.thresholdSet}
        onChange={(thresholdSet) => {
          change({ thresholdSet });
        }}
        options={THRESHOLD_SETS.map((value) => ({
          value,
          label: t(`rule.set.${value}.name`),
          note: (
            <>
              {t(`rule.set.${value}.what`)}{' '}
              <span className="block">{t('rule.source', { source: t(`rule.set.${value}.source`) })}</span>
            </>
          ),
        }))}
      />
      <div className="mt-4">
        <Fold
          title={t('rule.shifts')}
          line={
            draft.sameSideShiftDeg === 0 && draft.oppositeSideShiftDeg === 0
              ? t('rule.shiftsNone')
              : t('rule.shiftsLine', {
                  same: degrees(draft.sameSideShiftDeg),
                  opposite: degrees(draft.oppositeSideShiftDeg),
                })
          }
        >
          <p className="mb-3 text-small text-umber-soft">{t('rule.shiftsHint')}</p>
          <div className="grid gap-4 mid:grid-cols-2">
            <Stepper
              label={t('rule.same')}
              hint={t('rule.sameHint')}
              value={draft.sameSideShiftDeg}
              min={-SHIFT_MAX_DEG}
              max={SHIFT_MAX_DEG}
              step={0.5}
              bigStep={2}
              format={degrees}
              onChange={(sameSideShiftDeg) => {
                change({ sameSideShiftDeg });
              }}
            />
            <Stepper
              label={t('rule.opposite')}
              hint={t('rule.oppositeHint')}
              value={draft.oppositeSideShiftDeg}
              min={-SHIFT_MAX_DEG}
              max={SHIFT_MAX_DEG}
              step={0.5}
              bigStep={2}
              format={degrees}
              onChange={(oppositeSideShiftDeg) => {
                change({ oppositeSideShiftDeg });
              }}
            />
          </div>
        </Fold>
        <Fold title={t('rule.hillsShort')} line={t(`rule.skylineRule.${draft.skylineRule}.name`)}>
          <PickGroup
            label={t('rule.hills')}
            labelForEars
            stacked
            value={draft.skylineRule}
            onChange={(skylineRule) => {
              change({ skylineRule });
            }}
            options={SKYLINE_RULES.map((value) => ({
              value,
              label: t(`rule.skylineRule.${value}.name`),
              note: t(`rule.skylineRule.${value}.what`),
            }))}
          />
        </Fold>
      </div>
    </Board>
  );
}

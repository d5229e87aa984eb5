import { useTranslation } from 'react-i18next';
import type { MarkerNames } from '#shared/contracts/stars.js';
import { MOON_EVENTS, PHENOMENA, type MoonEvent, type Phenomenon } from '#shared/sky/vocabulary.js';
import { markerName } from '#src/lib/marker-names.js';
import { SelectField } from '#src/ui/field.js';
import { More } from '#src/ui/fold.js';
import { PickGroup } from '#src/ui/pick.js';
import { Stepper } from '#src/ui/stepper.js';
import type { MoonsChoice } from '../model/moons-address.js';

interface CountRuleProps {
  choice: MoonsChoice;
  change: (patch: Partial<MoonsChoice>) => void;
  markers: readonly MarkerNames[];
  /** The chosen star, also where it is none of those that are offered. */
  chosen: MarkerNames | null;
}

const NONE = 'none';

/** From which sign the Moons are counted. Closed: a village sets it once. */
export function CountRule(props: CountRuleProps) {
  const { choice, change, markers, chosen } = props;
  const { t } = useTranslation(['moons', 'sky']);
  const isOffered = markers.some(({ markerKey }) => markerKey === chosen?.markerKey);
  const options = chosen !== null && !isOffered ? [chosen, ...markers] : markers;
  return (
    <More label={t('rule.title')}>
      <div className="mt-2 mb-4 grid gap-4">
        <div className="grid gap-4 mid:grid-cols-2">
          <SelectField
            label={t('rule.marker')}
            value={choice.marker ?? NONE}
            onChange={({ currentTarget: { value } }) => {
              change({ marker: value === NONE ? null : value });
            }}
          >
            <option value={NONE}>{t('rule.none')}</option>
            {options.map((names) => (
              <option key={names.markerKey} value={names.markerKey}>
                {markerName(names)}
              </option>
            ))}
          </SelectField>
          {choice.marker !== null && (
            <SelectField
              label={t('rule.phenomenon')}
              value={choice.phenomenon}
              onChange={({ currentTarget: { value } }) => {
                change({ phenomenon: value as Phenomenon });
              }}
            >
              {PHENOMENA.map((phenomenon) => (
                <option key={phenomenon} value={phenomenon}>
                  {t(`sky:phenomenonTitle.${phenomenon}`)}
                </option>
              ))}
            </SelectField>
          )}
        </div>
        {choice.marker !== null && (
          <>
            <PickGroup<MoonEvent>
              label={t('rule.begins')}
              value={choice.begins}
              onChange={(begins) => {
                change({ begins });
              }}
              options={MOON_EVENTS.map((event) => ({ value: event, label: t(`event.${event}`) }))}
            />
            <Stepper
              className="w-48"
              label={t('rule.month')}
              value={choice.signMonth}
              min={1}
              max={12}
              hint={t('rule.monthHint')}
              onChange={(signMonth) => {
                change({ signMonth });
              }}
            />
            <p className="text-small text-umber-soft">{t('rule.means')}</p>
          </>
        )}
      </div>
    </More>
  );
}

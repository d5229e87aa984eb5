import { useTranslation } from 'react-i18next';
import type { SkyMarkerSpec } from '#shared/contracts/sky-markers.js';
import { CLOCK_MINUTES, SKY_CLOCKS } from '#shared/sky/vocabulary.js';
import { PickGroup } from '#src/ui/pick.js';
import { Stepper } from '#src/ui/stepper.js';
import { SolarHourStepper } from './solar-hour-stepper.js';

type SkyHour = Extract<SkyMarkerSpec, { kind: 'star-altitude' }>['at'];

const FIRST_MINUTES = 60;
const FIRST_HOUR = 21;
const MINUTE_STEP = 5;

/** When a star is looked at: by sunset, by sunrise or by the Sun's own hour. */
export function SkyHourFields({ at, onChange }: { at: SkyHour; onChange: (at: SkyHour) => void }) {
  const { t } = useTranslation('calendars');
  return (
    <>
      <PickGroup
        label={t('sign.clock.label')}
        value={at.clock}
        onChange={(clock) => {
          if (clock === 'solar-hour') onChange({ clock, solarHour: FIRST_HOUR });
          else onChange({ clock, minutes: at.clock === 'solar-hour' ? FIRST_MINUTES : at.minutes });
        }}
        options={SKY_CLOCKS.map((clock) => ({ value: clock, label: t(`sign.clock.${clock}`) }))}
      />
      {at.clock === 'solar-hour' ? (
        <SolarHourStepper
          value={at.solarHour}
          onChange={(solarHour) => onChange({ clock: 'solar-hour', solarHour })}
        />
      ) : (
        <Stepper
          label={t('sign.minutes')}
          value={at.minutes}
          {...CLOCK_MINUTES}
          step={MINUTE_STEP}
          bigStep={30}
          format={(minutes) => t('sign.minutesValue', { count: minutes })}
          onChange={(minutes) => onChange({ clock: at.clock, minutes })}
        />
      )}
    </>
  );
}

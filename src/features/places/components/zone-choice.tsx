import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { ComboField } from '#src/ui/combo-field.js';
import { allZones, zoneName } from '../model/time-zone.js';

/** All time zones, found by typing. The default export is what `lazy` asks for. */
export default function ZoneChoice({
  value,
  onChoose,
}: {
  value: string;
  onChoose: (timeZone: string) => void;
}) {
  const { t } = useTranslation('places');
  const options = useMemo(
    () => allZones([value]).map((timeZone) => ({ id: timeZone, text: zoneName(timeZone) })),
    [value],
  );
  return (
    <ComboField
      label={t('zone.choose')}
      hint={t('zone.chooseHint')}
      options={options}
      value={value === '' ? null : value}
      onChange={(timeZone) => {
        if (timeZone !== null && timeZone !== value) onChoose(timeZone);
      }}
    />
  );
}

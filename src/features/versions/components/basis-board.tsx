import { useTranslation } from 'react-i18next';
import type { VersionHeader } from '#shared/contracts/versions.js';
import { useDateWords } from '#src/lib/date-words.js';
import { Board } from '#src/ui/surfaces.js';
import { clarityRuns } from '../model/clarity-runs.js';

/** Everything besides the entries that the dates and the print rest on. */
export function BasisBoard({ header }: { header: VersionHeader }) {
  const { t, i18n } = useTranslation(['versions', 'places', 'sky']);
  const dates = useDateWords();
  const { place } = header;
  const months = dates.months(header.year);
  const degrees = new Intl.NumberFormat(i18n.language, { maximumFractionDigits: 4 });
  const latitude = t(place.latitudeDeg < 0 ? 'basis.south' : 'basis.north', {
    degrees: degrees.format(Math.abs(place.latitudeDeg)),
  });
  const longitude = t(place.longitudeDeg < 0 ? 'basis.west' : 'basis.east', {
    degrees: degrees.format(Math.abs(place.longitudeDeg)),
  });
  const facts = [
    [
      t('basis.place'),
      t('basis.placeLine', {
        name: place.name,
        latitude,
        longitude,
        elevation: degrees.format(place.elevationM),
      }),
    ],
    [t('basis.timeZone'), place.timeZone],
    [
      t('basis.skyline'),
      place.skyline.length === 0
        ? t('basis.skylineFlat')
        : t('basis.skylinePoints', { count: place.skyline.length }),
    ],
    [t('places:rule.hills'), t(`places:rule.skylineRule.${place.skylineRule}.name`)],
    [t('places:rule.pick'), t(`places:rule.set.${place.thresholdSet}.name`)],
    [
      t('basis.shifts'),
      t('basis.shiftsLine', {
        same: degrees.format(place.sameSideShiftDeg),
        opposite: degrees.format(place.oppositeSideShiftDeg),
      }),
    ],
    [
      t('basis.clarity'),
      clarityRuns(place.clarityByMonth)
        .map(({ from, to, clarity }) => {
          const words = { clarity: t(`sky:clarity.${clarity}`) };
          const first = months[from]?.long ?? '';
          return from === to
            ? t('basis.clarityMonth', { month: first, ...words })
            : t('basis.clarityRun', { from: first, to: months[to]?.long ?? '', ...words });
        })
        .join('\n'),
    ],
    [t('basis.languages'), `${header.villageLanguage.name}, ${header.officerLanguage.name}`],
    [t('basis.weather'), header.weatherContact],
    [t('basis.agriculture'), header.agricultureContact],
    [t('basis.engine'), header.engineVersion],
  ] as const;
  return (
    <Board title={t('basis.title')}>
      <dl>
        {facts.map(([label, value]) => (
          <div key={label} className="fact">
            <dt>{label}</dt>
            <dd>{value}</dd>
          </div>
        ))}
      </dl>
    </Board>
  );
}

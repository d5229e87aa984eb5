import { useTranslation } from 'react-i18next';
import type { RangedDay, SkylineEffect } from '#shared/contracts/stars.js';
import { useDateWords } from '#src/lib/date-words.js';
import { MarkerIcon } from '#src/ui/icons/marker-icon.js';
import { Board } from '#src/ui/surfaces.js';
import { Table } from '#src/ui/table.js';

/** Flat and hill dates as a table. */
export function EffectTable({ rows }: { rows: readonly SkylineEffect[] }) {
  const { t } = useTranslation(['places', 'sky']);
  return (
    <Table caption={t('effects.caption')} middle>
      <thead>
        <tr>
          <th scope="col">{t('effects.star')}</th>
          <th scope="col">{t('effects.flat')}</th>
          <th scope="col">{t('effects.hill')}</th>
          <th scope="col">{t('effects.difference')}</th>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={`${row.markerKey} ${row.phenomenon}`}>
            <th scope="row">
              <span className="flex items-center gap-3">
                <MarkerIcon markerKey={row.markerKey} size={26} />
                <span>
                  {row.name}
                  <span className="range-line">{t(`sky:phenomenon.${row.phenomenon}`)}</span>
                </span>
              </span>
            </th>
            <td>
              <DayWithRange day={row.flat} instead={t('effects.none')} />
            </td>
            <td>
              <DayWithRange day={row.hill} instead={<WhyNone row={row} />} isMain />
            </td>
            <td>
              <Difference days={row.differenceDays} />
            </td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}

/** The same for a phone: one card for each star and day. */
export function EffectCards({ rows }: { rows: readonly SkylineEffect[] }) {
  const { t } = useTranslation(['places', 'sky']);
  return (
    <ul className="grid gap-3">
      {rows.map((row) => (
        <li key={`${row.markerKey} ${row.phenomenon}`}>
          <Board
            level={3}
            title={
              <span className="flex items-center gap-3">
                <MarkerIcon markerKey={row.markerKey} size={26} />
                {t('effects.starAndDay', { star: row.name, day: t(`sky:phenomenon.${row.phenomenon}`) })}
              </span>
            }
          >
            <dl className="grid grid-cols-2 gap-3 leading-snug">
              <div>
                <dt className="text-small text-umber-soft">{t('effects.flatShort')}</dt>
                <dd>
                  <DayWithRange day={row.flat} instead={t('effects.none')} />
                </dd>
              </div>
              <div>
                <dt className="text-small text-umber-soft">{t('effects.hillShort')}</dt>
                <dd>
                  <DayWithRange day={row.hill} instead={<WhyNone row={row} />} isMain />
                </dd>
              </div>
            </dl>
            <p className="mt-2 text-small">
              <DifferenceSentence days={row.differenceDays} />
            </p>
          </Board>
        </li>
      ))}
    </ul>
  );
}

function DayWithRange({
  day,
  instead,
  isMain = false,
}: {
  day: RangedDay | null;
  instead: React.ReactNode;
  isMain?: boolean;
}) {
  const { t } = useTranslation('places');
  const words = useDateWords();
  if (day === null) return <span className="text-small text-umber-soft">{instead}</span>;
  const about = t('effects.about', { day: words.day(day.gregorian) });
  return (
    <>
      {isMain ? <strong>{about}</strong> : about}
      <span className="range-line">
        <RangeWords day={day} />
      </span>
    </>
  );
}

function RangeWords({ day: { early, late } }: { day: RangedDay }) {
  const { t } = useTranslation('places');
  const words = useDateWords();
  if (early !== null && late !== null) return words.range(early.gregorian, late.gregorian, 'short');
  if (late !== null) return t('effects.notAfter', { to: words.day(late.gregorian, 'short') });
  if (early !== null) return t('effects.notBefore', { from: words.day(early.gregorian, 'short') });
  return t('effects.openRange');
}

/** Why there is no date over these hills. */
function WhyNone({ row }: { row: SkylineEffect }) {
  const { t } = useTranslation('places');
  if (row.hillOutcome !== 'rises-and-sets') return t(`effects.why.${row.hillOutcome}`);
  return row.hillPhenomenonOutcome === 'never-dark-enough'
    ? t('effects.why.never-dark-enough')
    : t('effects.why.none-in-this-year');
}

function Difference({ days }: { days: number | null }) {
  const { t } = useTranslation('common');
  const { t: tPlaces } = useTranslation('places');
  if (days === null)
    return <span className="text-small text-umber-soft">{tPlaces('effects.differenceNone')}</span>;
  if (days === 0) return t('sameDay');
  return days > 0 ? t('daysLater', { count: days }) : t('daysEarlier', { count: -days });
}

function DifferenceSentence({ days }: { days: number | null }) {
  const { t } = useTranslation('places');
  if (days === null) return t('effects.cannotCompare');
  if (days === 0) return t('effects.same');
  return days > 0 ? t('effects.later', { count: days }) : t('effects.earlier', { count: -days });
}

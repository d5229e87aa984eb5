import { useTranslation } from 'react-i18next';
import type { FirstCrescent, MoonRow, MoonTable } from '#shared/contracts/moons.js';
import type { Place } from '#shared/contracts/places.js';
import { Table } from '#src/ui/table.js';
import { useMoonWords } from './moon-words.js';

/** The same Moons in words and numbers. */
export function MoonsTable({ table, place }: { table: MoonTable; place: Place }) {
  const { t } = useTranslation('moons');
  const { dates } = useMoonWords();
  return (
    <Table className="mt-3" caption={t('table.caption', { year: dates.year(table.year), place: place.name })}>
      <thead>
        <tr>
          <th scope="col">{t('table.month')}</th>
          <th scope="col">{t('table.new')}</th>
          <th scope="col">{t('table.crescent')}</th>
          <th scope="col">{t('table.full')}</th>
        </tr>
      </thead>
      <tbody>
        {table.moons.map((row) => (
          <tr key={row.newMoon.dayNumber}>
            <MonthCell row={row} />
            <td>
              {t('table.at', { day: dates.day(row.newMoon.gregorian, 'short'), time: row.newMoon.localTime })}
            </td>
            <CrescentCell crescent={row.firstCrescent} />
            <td>
              {t('table.at', {
                day: dates.day(row.fullMoon.gregorian, 'short'),
                time: row.fullMoon.localTime,
              })}
            </td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}

function MonthCell({ row }: { row: MoonRow }) {
  const { t } = useTranslation('moons');
  const words = useMoonWords();
  const { month } = row;
  return (
    <th scope="row">
      {words.name(row)}
      {month !== null && (
        <span className="range-line">
          {t('table.ofYear', { year: words.dates.year(month.localYear) })}
          {month.holdsSign && ` · ${t('table.holdsSign')}`}
        </span>
      )}
    </th>
  );
}

function CrescentCell({ crescent: { outcome, expected, early, late } }: { crescent: FirstCrescent }) {
  const { t } = useTranslation('moons');
  const { dates } = useMoonWords();
  if (!expected) {
    return <td>{t(`crescent.noneShort.${outcome === 'dated' ? 'stays-too-low' : outcome}`)}</td>;
  }
  const range =
    early && late && early.dayNumber < late.dayNumber
      ? ` · ${dates.range(early.gregorian, late.gregorian, 'short')}`
      : '';
  return (
    <td>
      {dates.day(expected.gregorian, 'short')}
      <span className="range-line">
        {t(`crescent.word.${expected.word}`)}
        {range}
      </span>
    </td>
  );
}

import { useTranslation } from 'react-i18next';
import type { MoonTable } from '#shared/contracts/moons.js';
import { type DateWords, useDateWords } from '#src/lib/date-words.js';
import { Board } from '#src/ui/surfaces.js';

type VenusLine = MoonTable['venus'][number];

/** The four turning points of Venus in the year; most years have two or three of them. */
export function VenusBoard({ table }: { table: MoonTable }) {
  const { t } = useTranslation('moons');
  const dates = useDateWords();
  return (
    <Board title={t('venus.title')}>
      <dl className="grid gap-4 mid:grid-cols-2">
        {table.venus.map((line) => (
          <div key={line.appearance}>
            <dt>{t(`venus.appearance.${line.appearance}`)}</dt>
            <VenusDays line={line} dates={dates} year={table.year} />
          </div>
        ))}
      </dl>
    </Board>
  );
}

function VenusDays({ line, dates, year }: { line: VenusLine; dates: DateWords; year: number }) {
  const { t } = useTranslation('moons');
  const { appearance, outcome, occurrences } = line;
  if (outcome !== 'dated') {
    return (
      <dd className="text-small text-umber-soft">{t(`venus.${outcome}`, { year: dates.year(year) })}</dd>
    );
  }
  const isMorning = appearance === 'morning-first' || appearance === 'morning-last';
  return occurrences.map(({ expected, early, late, notes }) => (
    <dd key={expected.dayNumber}>
      <p>
        {t(isMorning ? 'venus.morningOf' : 'venus.eveningOf', {
          // Before the Sun it goes so fast that a range may shrink to a day; nobody's eyes are that sure.
          days:
            early && late && early.dayNumber === late.dayNumber
              ? t('venus.withinADay', { day: dates.day(expected.gregorian) })
              : dates.aboutWithin(expected.gregorian, early?.gregorian ?? null, late?.gregorian ?? null),
        })}
      </p>
      <p className="text-small text-umber-soft">{t(`venus.meaning.${appearance}`)}</p>
      {notes.map((note) =>
        note === 'threshold-extrapolated' || note === 'standstill' ? null : (
          <p key={note} className="text-small">
            {t(`venus.note.${note}`)}
          </p>
        ),
      )}
    </dd>
  ));
}

import { Table2 } from 'lucide-react';
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import type { MoonTable } from '#shared/contracts/moons.js';
import type { Place } from '#shared/contracts/places.js';
import { dayNumberOf, todayIn } from '#src/lib/days.js';
import { More } from '#src/ui/fold.js';
import { MoonIcon } from '#src/ui/pictures/moon-glyph.js';
import { MoonRowPicture } from '#src/ui/pictures/moon-row.js';
import { Board } from '#src/ui/surfaces.js';
import { MOON_EVENTS } from '#shared/sky/vocabulary.js';
import { moonRowsOf, type MoonPictureRow } from '../model/moon-rows.js';
import { CountSentences } from './count-sentences.js';
import { useMoonWords } from './moon-words.js';
import { MoonsTable } from './moons-table.js';

/** The year as rows of holes, what the numbering makes of it, and the table behind one key. */
export function MoonsPicture({
  table,
  place,
  children,
}: {
  table: MoonTable;
  place: Place;
  /** The rule by which the months are counted. */
  children: ReactNode;
}) {
  const { t } = useTranslation('moons');
  const today = dayNumberOf(todayIn(place.timeZone));
  const rows = moonRowsOf(table);
  return (
    <Board title={t('picture.title')}>
      <CountSentences table={table} />
      {children}
      <ul className="moon-rows mt-3">
        {rows.map((row) => (
          <Row key={row.first} row={row} latitudeDeg={place.latitudeDeg} today={today} />
        ))}
      </ul>
      <ul className="mt-4 flex flex-wrap gap-x-5 gap-y-2 text-small">
        {MOON_EVENTS.map((event) => (
          <li key={event} className="flex items-center gap-2">
            <MoonIcon event={event} latitudeDeg={place.latitudeDeg} size={22} />
            {t(`event.${event}`)}
          </li>
        ))}
      </ul>
      <p className="mt-2 text-small text-umber-soft">{t('picture.how')}</p>
      <More label={t('picture.table')} icon={<Table2 aria-hidden size={20} />}>
        <MoonsTable table={table} place={place} />
      </More>
    </Board>
  );
}

function Row({ row, latitudeDeg, today }: { row: MoonPictureRow; latitudeDeg: number; today: number }) {
  const { t } = useTranslation('moons');
  const words = useMoonWords();
  return (
    <li className={row.opensYear === null ? undefined : 'opens-year'}>
      {row.opensYear !== null && (
        <p className="col-span-2 mb-1 text-small text-umber-soft">
          {t('picture.localYear', { year: words.dates.year(row.opensYear) })}
        </p>
      )}
      <span className="pb-1 text-small leading-tight" aria-hidden>
        {words.shortName(row.moon)}
      </span>
      <MoonRowPicture
        days={row}
        latitudeDeg={latitudeDeg}
        today={today}
        dashed={row.moon.month?.thirteenth}
        label={useSpoken(row)}
      />
    </li>
  );
}

/** The row as one sentence. */
function useSpoken({ moon, beginsDay, sign }: MoonPictureRow): string {
  const { t } = useTranslation('moons');
  const words = useMoonWords();
  const day = (of: { gregorian: string }): string => words.dates.day(of.gregorian);
  const { expected } = moon.firstCrescent;
  const days = [
    t('picture.newOn', { day: day(moon.newMoon) }),
    ...(expected ? [t('picture.crescentOn', { day: day(expected) })] : []),
    ...(beginsDay !== null && moon.month ? [t('picture.beginsOn', { day: day(moon.month.begins) })] : []),
    t('picture.fullOn', { day: day(moon.fullMoon) }),
    ...(sign ? [t('picture.signOn', { day: words.dates.day(sign.expected) })] : []),
  ];
  return t('picture.spoken', { month: words.name(moon), days: days.join(', ') });
}

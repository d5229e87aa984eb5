import { useTranslation } from 'react-i18next';
import type { MoonTable } from '#shared/contracts/moons.js';
import type { Place } from '#shared/contracts/places.js';
import { dayNumberOf, todayIn } from '#src/lib/days.js';
import { MoonIcon } from '#src/ui/pictures/moon-glyph.js';
import { Board } from '#src/ui/surfaces.js';
import { nextCrescent } from '../model/moon-rows.js';
import { useMoonWords } from './moon-words.js';

/** The one date of the screen: the evening to go out for. Only in the present year. */
export function NextCrescent({ table, place }: { table: MoonTable; place: Place }) {
  const { t } = useTranslation(['moons', 'sky']);
  const words = useMoonWords();
  const today = dayNumberOf(todayIn(place.timeZone));
  if (today < table.firstDayNumber || today > table.lastDayNumber) return null;
  const next = nextCrescent(table.moons, today);
  const evening = next?.firstCrescent.expected;
  if (!next || !evening) return null;
  const where = evening.compass === null ? null : t(`sky:compass.${evening.compass as 'w'}`);
  return (
    <Board title={t('next.title')}>
      <p className="flex items-center gap-3 text-date">
        <MoonIcon event="first-crescent" latitudeDeg={place.latitudeDeg} size={36} />
        {t('next.day', { day: words.dates.day(evening.gregorian) })}
      </p>
      <div className="mt-2 grid gap-1.5">
        {words.crescent(next.firstCrescent).map((line) => (
          <p key={line}>{line}</p>
        ))}
        {where !== null && evening.bestAt !== null && (
          <p>
            {evening.sunsetAt === null
              ? t('crescent.lookDark', { compass: where, time: evening.bestAt })
              : t('crescent.look', { compass: where, time: evening.bestAt, sunset: evening.sunsetAt })}
          </p>
        )}
      </div>
    </Board>
  );
}

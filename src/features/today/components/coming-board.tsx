import { useTranslation } from 'react-i18next';
import type { OccurrenceDays } from '#shared/contracts/stars.js';
import type { Today } from '#shared/contracts/today.js';
import { useDateWords } from '#src/lib/date-words.js';
import { dayNumberOf, readDate } from '#src/lib/days.js';
import { markerName } from '#src/lib/marker-names.js';
import { useSkySignWords } from '#src/lib/sky-sign-words.js';
import { Ladder, type Rung } from '#src/ui/ladder.js';

/** Something to look for, and when. */
interface Thing {
  key: string;
  title: string;
  occurrence: OccurrenceDays;
}

/** The days to come as a ladder: a hole for each thing, a small hole for each day between. */
export function ComingBoard({ today }: { today: Today }) {
  const { t } = useTranslation(['today', 'sky']);
  const words = useDateWords();
  const signWords = useSkySignWords();
  const date = readDate(today.date);
  if (date === null || today.coming.length + today.comingSigns.length === 0) return null;
  const todayNumber = dayNumberOf(date);

  const rungs: Rung[] = [
    {
      key: 'today',
      title: t('today:coming.today', { day: words.day(today.date) }),
      daysSinceLast: 0,
      here: true,
    },
  ];
  const whenOf = ({ expected, early, late }: OccurrenceDays) =>
    expected.dayNumber < todayNumber && late !== null
      ? t('today:coming.inRange', { day: words.day(late.gregorian) })
      : words.aboutBetween(expected.gregorian, early?.gregorian ?? null, late?.gregorian ?? null);
  const things: Thing[] = [
    ...today.coming.map(({ marker, phenomenon, occurrence }) => ({
      key: `${marker.markerKey} ${phenomenon}`,
      title: t('today:coming.item', {
        marker: markerName(marker),
        phenomenon: t(`sky:phenomenon.${phenomenon}`),
      }),
      occurrence,
    })),
    ...today.comingSigns.map(({ spec, marker, occurrence }) => ({
      key: `${JSON.stringify(spec)} ${String(occurrence.expected.dayNumber)}`,
      title: signWords(spec, new Map(marker ? [[marker.markerKey, marker]] : [])),
      occurrence,
    })),
  ];
  const dayOf = ({ occurrence }: Thing) => Math.max(occurrence.expected.dayNumber, todayNumber);
  let last = todayNumber;
  for (const thing of things.sort((a, b) => dayOf(a) - dayOf(b))) {
    rungs.push({
      key: thing.key,
      title: thing.title,
      daysSinceLast: dayOf(thing) - last,
      children: <span className="block">{whenOf(thing.occurrence)}</span>,
    });
    last = dayOf(thing);
  }
  return (
    <section>
      <h2 className="mb-2">
        {t(
          today.comingIsLater && today.comingSigns.length === 0
            ? 'today:coming.titleLater'
            : 'today:coming.title',
        )}
      </h2>
      <Ladder rungs={rungs} label={t('today:coming.label')} />
    </section>
  );
}

import { useTranslation } from 'react-i18next';
import type { Today } from '#shared/contracts/today.js';
import { useDateWords } from '#src/lib/date-words.js';
import { dayNumberOf, readDate } from '#src/lib/days.js';
import { markerName } from '#src/lib/marker-names.js';
import { Ladder, type Rung } from '#src/ui/ladder.js';

/** The days to come as a ladder: a hole for each thing, a small hole for each day between. */
export function ComingBoard({ today }: { today: Today }) {
  const { t } = useTranslation(['today', 'sky']);
  const words = useDateWords();
  const date = readDate(today.date);
  if (date === null || today.coming.length === 0) return null;
  const todayNumber = dayNumberOf(date);

  const rungs: Rung[] = [
    {
      key: 'today',
      title: t('today:coming.today', { day: words.day(today.date) }),
      daysSinceLast: 0,
      here: true,
    },
  ];
  let last = todayNumber;
  for (const { marker, phenomenon, occurrence } of today.coming) {
    const { expected, early, late } = occurrence;
    const at = Math.max(expected.dayNumber, todayNumber);
    rungs.push({
      key: `${marker.markerKey} ${phenomenon}`,
      title: t('today:coming.item', {
        marker: markerName(marker),
        phenomenon: t(`sky:phenomenon.${phenomenon}`),
      }),
      daysSinceLast: Math.max(0, at - last),
      children: (
        <span className="block">
          {expected.dayNumber < todayNumber && late !== null
            ? t('today:coming.inRange', { day: words.day(late.gregorian) })
            : words.aboutBetween(expected.gregorian, early?.gregorian ?? null, late?.gregorian ?? null)}
        </span>
      ),
    });
    last = Math.max(last, at);
  }
  return (
    <section>
      <h2 className="mb-2">{t(today.comingIsLater ? 'today:coming.titleLater' : 'today:coming.title')}</h2>
      <Ladder rungs={rungs} label={t('today:coming.label')} />
    </section>
  );
}

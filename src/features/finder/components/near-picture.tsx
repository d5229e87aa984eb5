import { useTranslation } from 'react-i18next';
import type { FoundMarker } from '#shared/contracts/finder.js';
import { useDateWords } from '#src/lib/date-words.js';
import { endOfNight } from '#src/lib/sky-words.js';
import { RingRow } from '#src/ui/pictures/ring-row.js';
import { nearRow } from '../model/near-row.js';
import { useFinderFacts } from './finder-context.js';

/** The wanted days as a bar and the sign's range as a bracket under one row of days. The words stand beside it. */
export function NearPicture({ found }: { found: FoundMarker }) {
  const { t } = useTranslation('finder');
  const dates = useDateWords();
  const { wanted, words } = useFinderFacts();
  const { from, to } = { from: wanted.from.dayNumber, to: wanted.to.dayNumber };
  const row = nearRow(found, { from, to });
  if (row === null) return null;
  const { early, expected, late } = found.days;
  return (
    <div>
      <RingRow
        span={row}
        ranges={[
          {
            key: found.phenomenon,
            early: early?.dayNumber ?? null,
            expected: expected.dayNumber,
            late: late?.dayNumber ?? null,
            side: endOfNight(found.phenomenon),
          },
        ]}
        windows={[{ key: 'wanted', days: { earliest: from, bestFrom: from, bestTo: to, lastAdvised: to } }]}
        label={t('picture', {
          star: words.name(found),
          day: `${words.day(found)}, ${words.range(found.days)}`,
          wanted: words.wanted(wanted),
        })}
      />
      <div className="picture flex justify-between text-small text-umber-soft" aria-hidden>
        <span>{dates.day(row.first, 'short')}</span>
        <span>{dates.day(row.last, 'short')}</span>
      </div>
    </div>
  );
}

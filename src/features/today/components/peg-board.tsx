import { Trans, useTranslation } from 'react-i18next';
import type { Today } from '#shared/contracts/today.js';
import { useDateWords } from '#src/lib/date-words.js';
import { dateOfDayNumber } from '#src/lib/days.js';
import { markerName } from '#src/lib/marker-names.js';
import { SignIcon } from '#src/ui/icons/drawn-icon.js';
import { RingRow } from '#src/ui/pictures/ring-row.js';
import { WindowKey } from '#src/ui/pictures/lane-key.js';
import { SignsInLine } from '#src/lib/signs-in-line.js';
import { Board } from '#src/ui/surfaces.js';
import { monthRow } from '../model/month-row.js';

/** The wall's own row with today's peg, and which work is open now. */
export function PegBoard({ today }: { today: Today }) {
  const { t } = useTranslation(['today', 'sky']);
  const words = useDateWords();
  const row = monthRow(today.date, today.coming, today.openWindows);
  const count = row.span.last - row.span.first + 1;
  const month = words.months(dateOfDayNumber(row.span.first).year)[dateOfDayNumber(row.span.first).month - 1];
  return (
    <Board
      title={
        <Trans
          t={t}
          i18nKey="today:peg.title"
          values={{ hole: today.hole, row: today.row }}
          components={{ b: <strong /> }}
        />
      }
    >
      <RingRow
        span={row.span}
        today={row.today}
        ranges={row.ranges.map(({ mark }) => mark)}
        windows={row.windows.map(({ row: window }) => window)}
        label={t('today:peg.picture', {
          month: month?.long ?? '',
          day: row.today - row.span.first + 1,
          count,
        })}
      />
      <ul className="mt-2 grid gap-2">
        {row.ranges.map(({ mark, coming }) => (
          <li key={mark.key}>
            {t('today:peg.mayShow', {
              marker: markerName(coming.marker),
              phenomenon: t(`sky:phenomenon.${coming.phenomenon}`),
              between: words.aboutWithin(
                coming.occurrence.expected.gregorian,
                coming.occurrence.early?.gregorian ?? null,
                coming.occurrence.late?.gregorian ?? null,
              ),
            })}
          </li>
        ))}
        {row.windows.map(({ open }) => (
          <li key={open.entryId} className="flex items-start gap-3">
            <SignIcon sign={open.icon} size={32} className="mt-0.5 shrink-0" />
            <div>
              {t('today:peg.window', {
                title: open.titleOfficer,
                range: words.range(open.window.bestFrom, open.window.bestTo),
                last: words.day(open.window.lastAdvised),
              })}
              {open.otherSigns !== '' && (
                <span className="block text-umber-soft text-small">{open.otherSigns}</span>
              )}
              <SignsInLine
                record={open.awaits}
                window={open.window}
                year={open.year}
                home={{ calendarId: open.calendarId, entryId: open.entryId }}
              />
            </div>
          </li>
        ))}
      </ul>
      {row.windows.length > 0 ? (
        <div className="mt-3">
          <WindowKey />
        </div>
      ) : (
        <p className="mt-2 text-umber-soft">{t('today:peg.nothing')}</p>
      )}
      <p className="mt-2 text-umber-soft text-small">{t('today:peg.lostPlace')}</p>
    </Board>
  );
}

import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import type { TodaysEngine } from '#shared/contracts/todays-engine.js';
import type { Version } from '#shared/contracts/versions.js';
import { useEntryWords } from '#src/lib/entry-words.js';
import { More } from '#src/ui/fold.js';
import { Board } from '#src/ui/surfaces.js';
import { Table } from '#src/ui/table.js';
import { todaysEngineQuery } from '../api/todays-engine-query.js';

/** An older engine reckoned this version: its days stay, and here stands what today's would say. */
export function EngineNotice({ version }: { version: Version }) {
  const { t } = useTranslation('versions');
  const { calendarId, number, header, todaysEngine } = version;
  const { data } = useQuery({
    ...todaysEngineQuery(calendarId, number),
    enabled: todaysEngine !== undefined,
  });
  if (todaysEngine === undefined) return null;
  return (
    <Board className="mb-4" title={t('engine.title')}>
      <p>{t('engine.stays', { frozenBy: header.engineVersion, today: todaysEngine })}</p>
      {data && <Found found={data} year={header.year} />}
    </Board>
  );
}

function Found({ found, year }: { found: TodaysEngine; year: number }) {
  const { t } = useTranslation('versions');
  const words = useEntryWords();
  const { differences, entryCount } = found;
  const most = Math.max(0, ...differences.map(({ days }) => Math.abs(days ?? 0)));
  if (differences.length === 0) return <p className="mt-2">{t('engine.same')}</p>;
  return (
    <>
      <p className="mt-2" role="status">
        <strong>{t('engine.differ', { count: differences.length, all: entryCount })}</strong>{' '}
        {most > 0 && t('engine.most', { count: most })}
      </p>
      <More label={t('engine.list')}>
        <Table className="side-by-side" caption={t('engine.caption')}>
          <thead>
            <tr>
              <th scope="col">{t('compare.entry')}</th>
              <th scope="col">{t('engine.frozen')}</th>
              <th scope="col">{t('engine.today')}</th>
            </tr>
          </thead>
          <tbody>
            {differences.map((entry) => (
              <tr key={entry.entryId}>
                <th scope="row">{entry.titleOfficer}</th>
                <td data-label={t('engine.frozen')}>{words.window(entry, entry.frozen, year)}</td>
                <td data-label={t('engine.today')}>{words.window(entry, entry.today, year)}</td>
              </tr>
            ))}
          </tbody>
        </Table>
      </More>
    </>
  );
}

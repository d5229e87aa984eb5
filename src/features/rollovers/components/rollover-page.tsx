import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { useParams } from 'react-router-dom';
import type { RolloverReport } from '#shared/contracts/rollovers.js';
import { useDateWords } from '#src/lib/date-words.js';
import { PageOnItsWay } from '#src/lib/page-on-its-way.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { ButtonLink } from '#src/ui/button.js';
import { Mast, Page } from '#src/ui/page.js';
import { Board } from '#src/ui/surfaces.js';
import { rolloverQuery } from '../api/rollovers-queries.js';
import { rolledGroups } from '../model/rolled-groups.js';
import { RolledTable } from './rolled-table.js';

/** What the new year changed in a draft that began as the year before. */
export function RolloverPage() {
  const { t } = useTranslation('rollovers');
  const { calendarId = '' } = useParams();
  const { data, error, refetch } = useQuery(rolloverQuery(calendarId));
  if (data !== undefined) return <Report report={data} />;
  return (
    <PageOnItsWay
      title={t('counts.title')}
      backTo={paths.calendars()}
      error={error}
      gone={{ title: t('gone'), why: t('goneWhy') }}
      trouble={t('trouble')}
      onRetry={() => void refetch()}
    />
  );
}

function Report({ report }: { report: RolloverReport }) {
  const { t } = useTranslation('rollovers');
  const dates = useDateWords();
  const { calendarId, fromYear: from, year, placeName: place, rolledBy: name, rolledAt } = report;
  const groups = rolledGroups(report.entries);
  usePageTitle(t('title', { from, year }));
  return (
    <Page>
      <Mast
        title={t('title', { from, year })}
        under={t('under', { place, name, when: dates.moment(rolledAt) })}
        backTo={paths.calendars()}
      />
      <div className="grid grid-cols-1 gap-4">
        <Board title={t('counts.title')}>
          <ul className="grid gap-1">
            {groups.map(({ group, entries }) => (
              <li key={group}>{t(`counts.${group}`, { count: entries.length, year })}</li>
            ))}
          </ul>
          {groups.length === 0 && <p>{t('counts.none')}</p>}
          <p className="mt-2 text-small text-umber-soft">{t('nothingAgreed', { from })}</p>
          <p className="mt-3">
            <ButtonLink to={paths.calendar(calendarId)}>{t('openDraft', { year })}</ButtonLink>
          </p>
        </Board>
        {groups.map(({ group, entries }) => (
          <Board key={group} title={t(`group.${group}`, { year })}>
            <RolledTable group={group} entries={entries} report={report} />
          </Board>
        ))}
      </div>
    </Page>
  );
}

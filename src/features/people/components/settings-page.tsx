import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { communityQuery } from '#src/lib/calendar-queries.js';
import { useCurrentCommunity, useRoles } from '#src/lib/community.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Mast, Page } from '#src/ui/page.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { peopleQuery } from '../api/people-queries.js';
import { SettingsForm } from './settings-form.js';
import { SettingsView } from './settings-view.js';
import { VillageTabs } from './village-tabs.js';

/** Languages, year start, contacts and who signs: the steward edits, everybody else reads. */
export function SettingsPage() {
  const { t } = useTranslation('people');
  const { communityId, communityName } = useCurrentCommunity();
  const { is } = useRoles();
  const words = useProblemWords();
  const community = useQuery(communityQuery(communityId));
  const people = useQuery({ ...peopleQuery(communityId), enabled: is('steward', 'officer', 'elder') });
  usePageTitle(t('settings.title'));
  const elders = (people.data ?? []).filter((person) => person.roles.includes('elder'));
  const ready = community.data !== undefined && (people.data !== undefined || !people.isLoading);

  return (
    <Page>
      <Mast title={communityName} under={t('settings.title')} />
      <VillageTabs />
      <div className="mt-4">
        {community.error !== null && (
          <TroubleNote sentence={words.problem(community.error)} onRetry={() => void community.refetch()} />
        )}
        {!ready && community.error === null && <Skeleton lines={8} />}
        {ready &&
          (is('steward') ? (
            <SettingsForm key={communityId} community={community.data} elders={elders} />
          ) : (
            <SettingsView community={community.data} elders={elders} />
          ))}
      </div>
    </Page>
  );
}

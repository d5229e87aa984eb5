import { useTranslation } from 'react-i18next';
import { useVillageName, VillageTabs } from '#src/features/people/components/village-tabs.js';
import { GroupsBoard } from '#src/features/sharing/components/groups-board.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { Mast, Page } from '#src/ui/page.js';

/** The village's groups, as a part of the village's page. */
export function Component() {
  const { t } = useTranslation('people');
  usePageTitle(t('tabs.groups'));
  return (
    <Page>
      <Mast title={useVillageName()} under={t('tabs.groups')} />
      <VillageTabs />
      <div className="mt-4">
        <GroupsBoard />
      </div>
    </Page>
  );
}

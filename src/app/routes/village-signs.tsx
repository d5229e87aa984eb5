import { useTranslation } from 'react-i18next';
import { useVillageName, VillageTabs } from '#src/features/people/components/village-tabs.js';
import { SignsList } from '#src/features/signs/components/signs-list.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { Mast, Page } from '#src/ui/page.js';

/** The village's signs of nature, as a part of the village's page. */
export function Component() {
  const { t } = useTranslation('people');
  usePageTitle(t('tabs.signs'));
  return (
    <Page>
      <Mast title={useVillageName()} under={t('tabs.signs')} />
      <VillageTabs />
      <div className="mt-4">
        <SignsList />
      </div>
    </Page>
  );
}

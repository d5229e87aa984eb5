import { useTranslation } from 'react-i18next';
import { useVillageName, VillageTabs } from '#src/features/people/components/village-tabs.js';
import { PlacesList } from '#src/features/places/components/places-list.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { Mast, Page } from '#src/ui/page.js';

/** The watching places, as the first part of the village's page. */
export function Component() {
  const { t } = useTranslation('people');
  usePageTitle(t('tabs.places'));
  return (
    <Page>
      <Mast title={useVillageName()} under={t('tabs.places')} />
      <VillageTabs />
      <div className="mt-4">
        <PlacesList />
      </div>
    </Page>
  );
}

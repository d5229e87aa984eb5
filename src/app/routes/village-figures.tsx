import { useTranslation } from 'react-i18next';
import { FiguresList } from '#src/features/figures/components/figures-list.js';
import { useVillageName, VillageTabs } from '#src/features/people/components/village-tabs.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { Mast, Page } from '#src/ui/page.js';

/** The village's own figures, as a part of the village's page. */
export function Component() {
  const { t } = useTranslation('people');
  usePageTitle(t('tabs.figures'));
  return (
    <Page>
      <Mast title={useVillageName()} under={t('tabs.figures')} />
      <VillageTabs />
      <div className="mt-4">
        <FiguresList />
      </div>
    </Page>
  );
}

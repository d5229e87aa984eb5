import { useTranslation } from 'react-i18next';
import { StillToAskBoard } from '#src/features/letters/components/still-to-ask-board.js';
import { useVillageName, VillageTabs } from '#src/features/people/components/village-tabs.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { Mast, Page } from '#src/ui/page.js';

/** Who is still to be asked, as a part of the village's page. */
export function Component() {
  const { t } = useTranslation('people');
  usePageTitle(t('tabs.asking'));
  return (
    <Page>
      <Mast title={useVillageName()} under={t('tabs.asking')} />
      <VillageTabs />
      <div className="mt-4">
        <StillToAskBoard />
      </div>
    </Page>
  );
}

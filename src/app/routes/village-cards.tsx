import { CardsBoard } from '#src/features/cards/components/cards-board.js';
import { useVillageName, VillageTabs } from '#src/features/people/components/village-tabs.js';
import { useTranslation } from 'react-i18next';
import { usePageTitle } from '#src/lib/page-title.js';
import { Mast, Page } from '#src/ui/page.js';

/** Printed cards, as a part of the village's page. */
export function Component() {
  const { t } = useTranslation('people');
  usePageTitle(t('tabs.cards'));
  return (
    <Page>
      <Mast title={useVillageName()} under={t('tabs.cards')} />
      <VillageTabs />
      <div className="mt-4">
        <CardsBoard />
      </div>
    </Page>
  );
}

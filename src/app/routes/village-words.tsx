import { useTranslation } from 'react-i18next';
import { useVillageName, VillageTabs } from '#src/features/people/components/village-tabs.js';
import { WordLists } from '#src/features/word-lists/components/word-lists.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { Mast, Page } from '#src/ui/page.js';

/** What the village calls things, as a part of the village's page. */
export function Component() {
  const { t } = useTranslation(['people', 'words']);
  usePageTitle(t('words:title'));
  return (
    <Page>
      <Mast title={useVillageName()} under={t('words:title')} />
      <VillageTabs />
      <div className="mt-4">
        <WordLists />
      </div>
    </Page>
  );
}

import { useTranslation } from 'react-i18next';
import { useCurrentCommunity, useRoles } from '#src/lib/community.js';
import { paths } from '#src/lib/paths.js';
import { TabLinks } from '#src/ui/pick.js';

/** The parts of the village; each is an address. Villagers and staff see those that are theirs. */
export function VillageTabs() {
  const { t } = useTranslation('people');
  const { is } = useRoles();
  const inner = is('steward', 'officer', 'elder');
  return (
    <TabLinks
      label={t('tabs.label')}
      links={[
        { to: paths.villagePlaces(), label: t('tabs.places') },
        { to: paths.villageFigures(), label: t('tabs.figures') },
        ...(inner ? [{ to: paths.villagePeople(), label: t('tabs.people') }] : []),
        { to: paths.villageGroups(), label: t('tabs.groups') },
        ...(is('steward', 'officer') ? [{ to: paths.villageAsking(), label: t('tabs.asking') }] : []),
        { to: paths.villageConsents(), label: t('tabs.consents') },
        { to: paths.villageSettings(), label: t('tabs.settings') },
        ...(inner ? [{ to: paths.villageRecords(), label: t('tabs.records') }] : []),
      ]}
    />
  );
}

/** Title of every village page. */
export function useVillageName(): string {
  return useCurrentCommunity().communityName;
}

import { useTranslation } from 'react-i18next';
import { useCurrentCommunity, useRoles } from '#src/lib/community.js';
import { paths } from '#src/lib/paths.js';
import { useSession } from '#src/lib/session.js';
import { TabLinks } from '#src/ui/pick.js';

/** The parts of the village; each is an address. Villagers and staff see those that are theirs. */
export function VillageTabs() {
  const { t } = useTranslation('people');
  const { is } = useRoles();
  // The records ask for a password.
  const { card } = useSession();
  const inner = is('steward', 'officer', 'elder');
  return (
    <TabLinks
      label={t('tabs.label')}
      links={[
        { to: paths.villagePlaces(), label: t('tabs.places') },
        { to: paths.villageFigures(), label: t('tabs.figures') },
        { to: paths.villageSigns(), label: t('tabs.signs') },
        { to: paths.villageWords(), label: t('tabs.words') },
        ...(inner ? [{ to: paths.villagePeople(), label: t('tabs.people') }] : []),
        { to: paths.villageGroups(), label: t('tabs.groups') },
        ...(is('steward', 'officer') ? [{ to: paths.villageAsking(), label: t('tabs.asking') }] : []),
        { to: paths.villageConsents(), label: t('tabs.consents') },
        ...(is('steward', 'elder', 'observer') ? [{ to: paths.villageCards(), label: t('tabs.cards') }] : []),
        { to: paths.villageSettings(), label: t('tabs.settings') },
        ...(inner && card === null ? [{ to: paths.villageRecords(), label: t('tabs.records') }] : []),
      ]}
    />
  );
}

/** Title of every village page. */
export function useVillageName(): string {
  return useCurrentCommunity().communityName;
}

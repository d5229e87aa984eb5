import { RecordsPage } from '#src/features/audit/components/records-page.js';
import { VillageTabs } from '#src/features/people/components/village-tabs.js';

export function Component() {
  return <RecordsPage tabs={<VillageTabs />} />;
}

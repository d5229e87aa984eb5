import { RegisterPage } from '#src/features/consents/components/register-page.js';
import { VillageTabs } from '#src/features/people/components/village-tabs.js';

/** The consent register, as a part of the village's page. */
export function Component() {
  return <RegisterPage tabs={<VillageTabs />} />;
}

import { VersionPage } from '#src/features/versions/components/version-page.js';

export function Component() {
  return <VersionPage />;
}

export { VersionsPage as Component } from '#src/features/versions/components/versions-page.js';

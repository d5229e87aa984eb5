export { DriftPage as Component } from '#src/features/drift/components/drift-page.js';

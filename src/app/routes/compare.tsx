export { ComparePage as Component } from '#src/features/versions/components/compare-page.js';

export { LookPage as Component } from '#src/features/look/components/look-page.js';

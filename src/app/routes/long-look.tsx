export { LongLookPage as Component } from '#src/features/decades/components/long-look-page.js';

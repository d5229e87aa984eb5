export { RolloverPage as Component } from '#src/features/rollovers/components/rollover-page.js';

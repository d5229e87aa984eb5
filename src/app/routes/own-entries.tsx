export { OwnEntriesPage as Component } from '#src/features/reviews/components/own-entries-page.js';

export { FinderPage as Component } from '#src/features/finder/components/finder-page.js';

export { PeoplePage as Component } from '#src/features/people/components/people-page.js';

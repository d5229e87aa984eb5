export { AirPage as Component } from '#src/features/air/components/air-page.js';

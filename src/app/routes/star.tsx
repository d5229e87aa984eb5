export { StarPage as Component } from '#src/features/stars/components/star-page.js';

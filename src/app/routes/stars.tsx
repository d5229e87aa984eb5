export { StarsPage as Component } from '#src/features/stars/components/stars-page.js';

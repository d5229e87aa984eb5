export { MoonsPage as Component } from '#src/features/moons/components/moons-page.js';

export { OpenPage as Component } from '#src/features/open-page/components/open-page.js';

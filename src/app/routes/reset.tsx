export { ResetPage as Component } from '#src/features/session/components/reset-page.js';

export { WelcomePage as Component } from '#src/features/session/components/welcome-page.js';

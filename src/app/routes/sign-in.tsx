export { SignInPage as Component } from '#src/features/session/components/sign-in-page.js';

export { AccountPage as Component } from '#src/features/session/components/account-page.js';

export { PrivacyPage as Component } from '#src/features/privacy/components/privacy-page.js';

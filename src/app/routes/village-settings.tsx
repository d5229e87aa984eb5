export { SettingsPage as Component } from '#src/features/people/components/settings-page.js';

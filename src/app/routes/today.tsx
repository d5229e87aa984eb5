export { TodayPage as Component } from '#src/features/today/components/today-page.js';

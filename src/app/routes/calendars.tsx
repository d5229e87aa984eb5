export { CalendarsPage as Component } from '#src/features/calendars/components/calendars-page.js';

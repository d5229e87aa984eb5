export { MeetingPage as Component } from '#src/features/reviews/components/meeting-page.js';

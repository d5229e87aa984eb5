export { SeasonReviewPage as Component } from '#src/features/season-reviews/components/season-review-page.js';

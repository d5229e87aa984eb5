export { ReviewPage as Component } from '#src/features/reviews/components/review-page.js';

export { CardPage as Component } from '#src/features/cards/components/card-page.js';

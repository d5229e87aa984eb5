export { PlacePage as Component } from '#src/features/places/components/place-page.js';

export { NewPlacePage as Component } from '#src/features/places/components/new-place-page.js';

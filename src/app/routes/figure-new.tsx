export { NewFigurePage as Component } from '#src/features/figures/components/figure-editor-pages.js';

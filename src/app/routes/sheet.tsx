export { SheetPreviewPage as Component } from '#src/features/sheets/components/sheet-page.js';

import { z } from 'zod';
import { id } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { ROLES } from './people.js';
import { versionNumber } from './versions.js';

export const SHEET_LAYOUTS = ['month-cards', 'year-board'] as const;
export type SheetLayout = (typeof SHEET_LAYOUTS)[number];
export const SHEET_PAPERS = ['A4'] as const;

export const sheetQuery = z.strictObject({
  layout: z.enum(SHEET_LAYOUTS).default('month-cards'),
  paper: z.enum(SHEET_PAPERS).default('A4'),
});
export type SheetQuery = z.infer<typeof sheetQuery>;

/** Pages as the geometry made them, in millimetres; the screen draws the same primitives as the PDF. */
export const sheetPreview = z.strictObject({
  layout: z.enum(SHEET_LAYOUTS),
  paper: z.enum(SHEET_PAPERS),
  label: z.string().nullable(),
  fileBytes: z.number().int().nullable(),
  /** Letters that none of the typefaces has: they would print as empty boxes. */
  missingLetters: z.array(z.string()),
  pages: z.array(z.record(z.string(), z.unknown())),
});
export type SheetPreview = z.infer<typeof sheetPreview>;

const params = z.strictObject({ calendarId: id, number: versionNumber });

export const sheetsEndpoints = {
  pdf: defineEndpoint({
    id: 'printSheet',
    method: 'GET',
    path: '/api/calendars/:calendarId/versions/:number/sheet.pdf',
    summary: 'The peg sheet as a PDF at true scale; anything unpublished is watermarked',
    access: member('calendar', ...ROLES),
    params,
    query: sheetQuery,
    fileType: 'application/pdf',
  }),
  preview: defineEndpoint({
    id: 'previewSheet',
    method: 'GET',
    path: '/api/calendars/:calendarId/versions/:number/sheet',
    summary: 'The pages of the peg sheet for the screen',
    access: member('calendar', ...ROLES),
    params,
    query: sheetQuery,
    response: sheetPreview,
  }),
} as const;

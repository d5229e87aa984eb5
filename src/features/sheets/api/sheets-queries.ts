import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { sheetsEndpoints, type SheetLayout } from '#shared/contracts/sheets.js';
import type { SheetPage } from '#shared/sheet/primitives.js';
import { apiUrl, callApi } from '#src/lib/api-client.js';

/** Which sheet of which version; `number` is a submission number or `draft`. */
export interface SheetChoice {
  calendarId: string;
  number: string;
  layout: SheetLayout;
}

/** The pages as the server's geometry made them; the PDF draws the same ones. */
export function sheetQuery({ calendarId, number, layout }: SheetChoice) {
  return queryOptions({
    queryKey: ['calendars', calendarId, 'sheet', number, layout],
    queryFn: async ({ signal }) => {
      const { pages, ...sheet } = await callApi(sheetsEndpoints.preview, {
        params: { calendarId, number },
        query: { layout, paper: 'A4' },
        signal,
      });
      return { ...sheet, pages: pages as unknown as SheetPage[] };
    },
    placeholderData: keepPreviousData,
    // A draft may have changed since; frozen versions answer the same again.
    staleTime: number === 'draft' ? 0 : 5 * 60_000,
  });
}

export function sheetPdfUrl({ calendarId, number, layout }: SheetChoice): string {
  return apiUrl(sheetsEndpoints.pdf, { params: { calendarId, number }, query: { layout, paper: 'A4' } });
}

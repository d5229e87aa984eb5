import { sheetsEndpoints } from '#shared/contracts/sheets.js';
import { FileReply } from '../../http/file-reply.js';
import type { Mount } from '../../http/mount.js';
import type { SheetsService } from './sheets.service.js';

export function sheetsRoutes(mount: Mount, sheets: SheetsService): void {
  mount.forMember(sheetsEndpoints.pdf, async ({ params, query }, actor) => {
    const { content, fileName } = await sheets.pdf(actor, params.calendarId, params.number, query);
    return new FileReply(content, fileName);
  });
  mount.forMember(sheetsEndpoints.preview, ({ params, query }, actor) =>
    sheets.preview(actor, params.calendarId, params.number, query),
  );
}

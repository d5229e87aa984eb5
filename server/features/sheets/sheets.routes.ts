import { meetingsEndpoints } from '#shared/contracts/meetings.js';
import { sheetsEndpoints } from '#shared/contracts/sheets.js';
import { FileReply } from '../../http/file-reply.js';
import type { Mount } from '../../http/mount.js';
import type { ReadBackService } from './read-back.service.js';
import type { SheetsService } from './sheets.service.js';

export function sheetsRoutes(mount: Mount, sheets: SheetsService, readBack: ReadBackService): void {
  mount.forMember(meetingsEndpoints.sheet, async ({ params }, actor) => {
    const { content, fileName } = await readBack.pdf(actor, params.calendarId, Number(params.number));
    return new FileReply(content, fileName);
  });
  mount.forMember(sheetsEndpoints.pdf, async ({ params, query }, actor) => {
    const { content, fileName } = await sheets.pdf(actor, params.calendarId, params.number, query);
    return new FileReply(content, fileName);
  });
  mount.forMember(sheetsEndpoints.preview, ({ params, query }, actor) =>
    sheets.preview(actor, params.calendarId, params.number, query),
  );
}

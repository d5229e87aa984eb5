import { exportsEndpoints } from '#shared/contracts/exports.js';
import { FileReply } from '../../http/file-reply.js';
import type { Mount } from '../../http/mount.js';
import type { ExportsService } from './exports.service.js';

export function exportsRoutes(mount: Mount, files: ExportsService): void {
  mount.forMember(exportsEndpoints.ics, async ({ params, query }, actor) => {
    const { content, fileName } = await files.ics(actor, params.calendarId, params.number, query);
    return new FileReply(content, fileName);
  });
  mount.forMember(exportsEndpoints.csv, async ({ params, query }, actor) => {
    const { content, fileName } = await files.csv(actor, params.calendarId, params.number, query);
    return new FileReply(content, fileName);
  });
}

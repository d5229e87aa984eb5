import { attachmentsEndpoints } from '#shared/contracts/attachments.js';
import { StoredFileReply } from '../../http/file-reply.js';
import type { Mount } from '../../http/mount.js';
import { wholeList } from '../../http/reply.js';
import type { AttachmentReadingService } from './attachment-reading.service.js';
import type { AttachmentWordsService } from './attachment-words.service.js';
import type { AttachmentsService } from './attachments.service.js';

export function attachmentsRoutes(
  mount: Mount,
  attachments: AttachmentsService,
  reading: AttachmentReadingService,
  words: AttachmentWordsService,
): void {
  mount.forMember(attachmentsEndpoints.list, async ({ query }, actor) =>
    wholeList(await attachments.list(actor, query)),
  );
  mount.forMemberUpload(attachmentsEndpoints.create, ({ body }, actor, file) =>
    attachments.create(actor, body, file),
  );
  mount.forMemberUpload(attachmentsEndpoints.addPart, ({ params, body }, actor, file) =>
    attachments.addPart(actor, params.attachmentId, body, file),
  );
  mount.forMember(attachmentsEndpoints.read, ({ params }, actor) =>
    attachments.read(actor, params.attachmentId),
  );
  mount.forMember(attachmentsEndpoints.readPart, async ({ params, request }, actor) => {
    const fromBeginning = /^(bytes=0-.*)?$/u.test(request.get('Range') ?? '') && request.method === 'GET';
    return new StoredFileReply(await reading.part(actor, params.attachmentId, params.part, fromBeginning));
  });
  mount.forMember(
    attachmentsEndpoints.readThumbnail,
    async ({ params }, actor) => new StoredFileReply(await reading.thumbnail(actor, params.attachmentId)),
  );
  mount.forMember(attachmentsEndpoints.saveWords, ({ params, body }, actor) =>
    words.save(actor, params.attachmentId, body),
  );
  mount.forMember(attachmentsEndpoints.remove, async ({ params }, actor) => {
    await attachments.remove(actor, params.attachmentId);
    return undefined;
  });
}

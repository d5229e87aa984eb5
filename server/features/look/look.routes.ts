import { lookEndpoints } from '#shared/contracts/look.js';
import { FileReply } from '../../http/file-reply.js';
import type { Mount } from '../../http/mount.js';
import type { LookCardService } from './look-card.service.js';
import type { LookService } from './look.service.js';

export function lookRoutes(mount: Mount, look: LookService, cards: LookCardService): void {
  mount.forMember(lookEndpoints.read, ({ params, query }, actor) => look.read(actor, params.placeId, query));
  mount.forMember(lookEndpoints.pdf, async ({ params, query }, actor) => {
    const { content, fileName } = await cards.pdf(actor, params.placeId, query);
    return new FileReply(content, fileName);
  });
}

import { consentsEndpoints } from '#shared/contracts/consents.js';
import { FileReply } from '../../http/file-reply.js';
import type { Mount } from '../../http/mount.js';
import { wholeList } from '../../http/reply.js';
import type { ConsentCardService } from './consent-card.service.js';
import type { ConsentsService } from './consents.service.js';

export function consentsRoutes(mount: Mount, consents: ConsentsService, cards: ConsentCardService): void {
  mount.forMember(consentsEndpoints.list, async (_call, actor) => wholeList(await consents.list(actor)));
  mount.forMember(consentsEndpoints.ofItem, ({ params }, actor) =>
    consents.ofItem(actor, params.itemType, params.itemId),
  );
  mount.forMember(consentsEndpoints.read, ({ params }, actor) => consents.read(actor, params.consentId));
  mount.forMember(consentsEndpoints.card, async ({ params }, actor) => {
    const { content, fileName } = await cards.pdf(actor, params.consentId);
    return new FileReply(content, fileName);
  });
  mount.forMember(consentsEndpoints.add, ({ body }, actor) => consents.add(actor, body));
  mount.forMember(consentsEndpoints.change, ({ params, body }, actor) =>
    consents.change(actor, params.consentId, body),
  );
  mount.forMemberUpload(consentsEndpoints.addSpoken, ({ body }, actor, file) =>
    consents.addSpoken(actor, body, file),
  );
  mount.forMemberUpload(consentsEndpoints.changeSpoken, ({ params, body }, actor, file) =>
    consents.changeSpoken(actor, params.consentId, body, file),
  );
  mount.forMember(consentsEndpoints.withdraw, ({ params, body }, actor) =>
    consents.withdraw(actor, params.consentId, body.version),
  );
}

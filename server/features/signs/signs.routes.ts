import { signsEndpoints } from '#shared/contracts/signs.js';
import type { Mount } from '../../http/mount.js';
import { wholeList } from '../../http/reply.js';
import type { SignsService } from './signs.service.js';

export function signsRoutes(mount: Mount, signs: SignsService): void {
  mount.forMember(signsEndpoints.list, async (_call, actor) => wholeList(await signs.list(actor)));
  mount.forMember(signsEndpoints.add, ({ body }, actor) => signs.add(actor, body));
  mount.forMember(signsEndpoints.update, ({ params, body }, actor) =>
    signs.update(actor, params.signId, body),
  );
  mount.forMember(signsEndpoints.remove, async ({ params }, actor) => {
    await signs.remove(actor, params.signId);
    return undefined;
  });
  mount.forMember(signsEndpoints.restore, ({ params }, actor) => signs.restore(actor, params.signId));
  mount.forMember(signsEndpoints.markSeen, ({ params, body }, actor) =>
    signs.markSeen(actor, params.signId, body),
  );
  mount.forMember(signsEndpoints.takeBackSeen, ({ params }, actor) =>
    signs.takeBackSeen(actor, params.signId, params.seenId),
  );
}

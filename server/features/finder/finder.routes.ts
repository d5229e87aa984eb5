import { finderEndpoints } from '#shared/contracts/finder.js';
import type { Mount } from '../../http/mount.js';
import { wholeList } from '../../http/reply.js';
import type { FinderService } from './finder.service.js';

export function finderRoutes(mount: Mount, finder: FinderService): void {
  mount.forMember(finderEndpoints.find, ({ params, query }, actor) =>
    finder.find(actor, params.placeId, query),
  );
  mount.forMember(finderEndpoints.names, async ({ params }, actor) =>
    wholeList(await finder.names(actor, params.placeId)),
  );
  mount.forMember(finderEndpoints.compareYears, ({ params, body }, actor) =>
    finder.compareYears(actor, params.placeId, body),
  );
}

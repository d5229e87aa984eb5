import { finderEndpoints } from '#shared/contracts/finder.js';
import type { Mount } from '../../http/mount.js';
import type { FinderService } from './finder.service.js';

export function finderRoutes(mount: Mount, finder: FinderService): void {
  mount.forMember(finderEndpoints.find, ({ params, query }, actor) =>
    finder.find(actor, params.placeId, query),
  );
  mount.forMember(finderEndpoints.compareYears, ({ params, body }, actor) =>
    finder.compareYears(actor, params.placeId, body),
  );
}

import { skyMarkersEndpoints } from '#shared/contracts/sky-markers.js';
import type { Mount } from '../../http/mount.js';
import { wholeList } from '../../http/reply.js';
import type { SkyMarkersService } from './sky-markers.service.js';

export function skyMarkersRoutes(mount: Mount, skyMarkers: SkyMarkersService): void {
  mount.forMember(skyMarkersEndpoints.list, async ({ params, query }, actor) =>
    wholeList(await skyMarkers.list(actor, params.placeId, query.year)),
  );
  mount.forMember(skyMarkersEndpoints.compute, ({ params, body }, actor) =>
    skyMarkers.compute(actor, params.placeId, body),
  );
}

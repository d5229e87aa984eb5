import { airEndpoints } from '#shared/contracts/air.js';
import type { Mount } from '../../http/mount.js';
import type { AirService } from './air.service.js';

export function airRoutes(mount: Mount, air: AirService): void {
  mount.forMember(airEndpoints.read, ({ params, query }, actor) =>
    air.read(actor, params.placeId, params.markerKey, query.year),
  );
}

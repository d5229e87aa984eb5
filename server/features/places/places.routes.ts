import { placesEndpoints } from '#shared/contracts/places.js';
import type { Mount } from '../../http/mount.js';
import { wholeList } from '../../http/reply.js';
import type { PlacesService } from './places.service.js';
import { timeZoneAt } from './time-zone.service.js';

export function placesRoutes(mount: Mount, places: PlacesService): void {
  mount.forMember(placesEndpoints.list, async (_call, actor) => wholeList(await places.list(actor)));
  mount.forMember(placesEndpoints.create, ({ body }, actor) => places.create(actor, body));
  mount.forMember(placesEndpoints.read, ({ params }, actor) => places.read(actor, params.placeId));
  mount.forMember(placesEndpoints.update, ({ params, body }, actor) =>
    places.update(actor, params.placeId, body),
  );
  mount.forPerson(placesEndpoints.findTimeZone, async ({ query }) => ({
    timeZone: await timeZoneAt(query.latitudeDeg, query.longitudeDeg),
  }));
}

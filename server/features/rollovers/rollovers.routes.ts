import { rolloversEndpoints } from '#shared/contracts/rollovers.js';
import type { Mount } from '../../http/mount.js';
import type { RolloversService } from './rollovers.service.js';

export function rolloversRoutes(mount: Mount, rollovers: RolloversService): void {
  mount.forMember(rolloversEndpoints.rollOver, ({ params }, actor) =>
    rollovers.rollOver(actor, params.calendarId),
  );
  mount.forMember(rolloversEndpoints.read, ({ params }, actor) => rollovers.report(actor, params.calendarId));
}

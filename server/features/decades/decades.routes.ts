import { decadesEndpoints } from '#shared/contracts/decades.js';
import type { Mount } from '../../http/mount.js';
import type { DecadesService } from './decades.service.js';

export function decadesRoutes(mount: Mount, decades: DecadesService): void {
  mount.forMember(decadesEndpoints.read, ({ params, query }, actor) =>
    decades.read(actor, params.calendarId, query),
  );
}

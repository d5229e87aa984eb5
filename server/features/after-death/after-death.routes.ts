import { afterDeathEndpoints } from '#shared/contracts/after-death.js';
import type { Mount } from '../../http/mount.js';
import type { AfterDeathService } from './after-death.service.js';

export function afterDeathRoutes(mount: Mount, deaths: AfterDeathService): void {
  mount.forMember(afterDeathEndpoints.read, ({ params }, actor) => deaths.read(actor, params.personId));
  mount.forMember(afterDeathEndpoints.note, ({ params, body }, actor) =>
    deaths.note(actor, params.personId, body),
  );
  mount.forMember(afterDeathEndpoints.nameHeir, ({ params, body }, actor) =>
    deaths.nameHeir(actor, params.personId, body),
  );
  mount.forMember(afterDeathEndpoints.undo, ({ params }, actor) => deaths.undo(actor, params.personId));
}

import { privacyEndpoints } from '#shared/contracts/privacy.js';
import type { Mount } from '../../http/mount.js';
import type { LeavingService } from './leaving.service.js';
import type { OwnDataService } from './own-data.service.js';

export function privacyRoutes(mount: Mount, ownData: OwnDataService, leaving: LeavingService): void {
  mount.forAnybody(privacyEndpoints.read, () => ownData.purposes());
  mount.forPerson(privacyEndpoints.exportOwn, (_call, person) => ownData.exportOwn(person));
  mount.forPerson(privacyEndpoints.leave, async ({ body }, person) => {
    await leaving.leave(person, body);
    return undefined;
  });
}

import { actualDaysEndpoints } from '#shared/contracts/actual-days.js';
import type { Mount } from '../../http/mount.js';
import type { ActualDaysService } from './actual-days.service.js';

export function actualDaysRoutes(mount: Mount, days: ActualDaysService): void {
  mount.forMember(actualDaysEndpoints.put, ({ params, body }, actor) => days.put(actor, params, body));
  mount.forMember(actualDaysEndpoints.remove, async ({ params }, actor) => {
    await days.remove(actor, params.calendarId, params.entryId);
    return undefined;
  });
}

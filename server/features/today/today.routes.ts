import { todayEndpoints } from '#shared/contracts/today.js';
import type { Mount } from '../../http/mount.js';
import type { TodayService } from './today.service.js';

export function todayRoutes(mount: Mount, today: TodayService): void {
  mount.forMember(todayEndpoints.read, ({ query }, actor) => today.read(actor, query.placeId ?? null));
}

import { versionsEndpoints } from '#shared/contracts/versions.js';
import type { Mount } from '../../http/mount.js';
import { wholeList } from '../../http/reply.js';
import type { ComparisonService } from './comparison.service.js';
import type { PublishingService } from './publishing.service.js';
import type { RestoringService } from './restoring.service.js';
import type { TodaysEngineService } from './todays-engine.service.js';
import type { VersionsService } from './versions.service.js';

export function versionsRoutes(
  mount: Mount,
  versions: VersionsService,
  publishing: PublishingService,
  comparison: ComparisonService,
  restoring: RestoringService,
  todaysEngine: TodaysEngineService,
): void {
  mount.forMember(versionsEndpoints.list, async ({ params }, actor) =>
    wholeList(await versions.list(actor, params.calendarId)),
  );
  mount.forMember(versionsEndpoints.submit, ({ params }, actor) =>
    publishing.submit(actor, params.calendarId),
  );
  mount.forMember(versionsEndpoints.read, ({ params }, actor) =>
    versions.read(actor, params.calendarId, Number(params.number)),
  );
  mount.forMember(versionsEndpoints.compare, ({ params, query }, actor) =>
    comparison.compare(actor, params.calendarId, query.from, query.to),
  );
  mount.forMember(versionsEndpoints.readTodaysEngine, ({ params }, actor) =>
    todaysEngine.read(actor, params.calendarId, Number(params.number)),
  );
  mount.forMember(versionsEndpoints.restore, ({ params }, actor) =>
    restoring.restore(actor, params.calendarId, Number(params.number)),
  );
  mount.forMember(versionsEndpoints.askChanges, ({ params, body }, actor) =>
    publishing.askChanges(actor, params.calendarId, Number(params.number), body),
  );
  mount.forMember(versionsEndpoints.publish, ({ params }, actor) =>
    publishing.publish(actor, params.calendarId, Number(params.number)),
  );
  mount.forMember(versionsEndpoints.recall, ({ params, body }, actor) =>
    publishing.recall(actor, params.calendarId, Number(params.number), body.note),
  );
}

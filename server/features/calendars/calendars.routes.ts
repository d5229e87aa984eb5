import { calendarsEndpoints } from '#shared/contracts/calendars.js';
import { draftChangesEndpoints, draftGlance } from '#shared/contracts/draft-changes.js';
import type { Mount } from '../../http/mount.js';
import { wholeList } from '../../http/reply.js';
import type { CalendarsService } from './calendars.service.js';
import type { DraftGlanceService } from './draft-glance.service.js';
import type { EntriesService } from './entries.service.js';

export function calendarsRoutes(
  mount: Mount,
  calendars: CalendarsService,
  entries: EntriesService,
  glances: DraftGlanceService,
): void {
  mount.forPerson(calendarsEndpoints.list, async ({ query }, person) =>
    wholeList(await calendars.listOf(person, query.communityId ?? null)),
  );
  mount.forMember(calendarsEndpoints.create, ({ body }, actor) => calendars.create(actor, body));
  mount.forMember(calendarsEndpoints.read, ({ params }, actor) => calendars.read(actor, params.calendarId));
  mount.forMember(calendarsEndpoints.listEntries, ({ params }, actor) =>
    entries.list(actor, params.calendarId),
  );
  mount.forMember(calendarsEndpoints.addEntry, ({ params, body }, actor) =>
    entries.add(actor, params.calendarId, body),
  );
  mount.forMember(calendarsEndpoints.updateEntry, ({ params, body }, actor) =>
    entries.update(actor, params.calendarId, params.entryId, body),
  );
  mount.forMember(calendarsEndpoints.duplicateEntry, ({ params }, actor) =>
    entries.duplicate(actor, params.calendarId, params.entryId),
  );
  mount.forMember(calendarsEndpoints.deleteEntry, async ({ params }, actor) => {
    await entries.remove(actor, params.calendarId, params.entryId);
    return undefined;
  });
  mount.forMember(calendarsEndpoints.restoreEntry, ({ params }, actor) =>
    entries.restore(actor, params.calendarId, params.entryId),
  );
  mount.forMember(calendarsEndpoints.reorderEntries, ({ params, body }, actor) =>
    entries.reorder(actor, params.calendarId, body.entryIds),
  );
  mount.forMemberStream(draftChangesEndpoints.watch, ({ params, query }) => ({
    schema: draftGlance,
    look: (actor) => glances.look(actor, params.calendarId),
    seconds: query.seconds ?? 0,
  }));
}

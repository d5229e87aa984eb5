import type { Calendar, Entry, EntryInput } from '#shared/contracts/calendars.js';
import type { StarTable } from '#server/features/stars/stars.service.js';
import { UPPER_TAZIMEL } from '#server/features/demo/demo-villages.data.js';
import type { Markers } from '#src/features/calendars/model/preview-dates.js';
import { refusal, type Answers, type Sent } from './answers.js';
import { CALENDAR, entryOf } from './draft-of-tazimel.js';
import { TAZIMEL } from './stars-of-tazimel.js';

const calendarPath = `/api/calendars/${CALENDAR.id}`;
const communityPath = `/api/communities/${CALENDAR.communityId}`;
const list = (items: readonly unknown[]) => ({ items, nextCursor: null });

export interface SavedDraft {
  calendar: Calendar;
  entries: Entry[];
  removed?: Entry;
}

/** One draft of the demo's place, and a server that keeps it, for tests of the editor's screens. */
export function draftServer(markers: Markers, table: StarTable) {
  return {
    calendarPath,
    communityPath,
    draft: (...changes: Partial<EntryInput>[]): SavedDraft => ({
      calendar: { ...CALENDAR },
      entries: changes.map((change, index) => entryOf(markers, index + 1, change)),
    }),
    server: (saved: SavedDraft) => answersOf(markers, table, saved),
  };
}

function answersOf(markers: Markers, table: StarTable, saved: SavedDraft): Answers {
  const answers: Record<string, unknown> = {
    [`GET ${calendarPath}`]: () => saved.calendar,
    [`GET ${calendarPath}/entries`]: () => ({ ...list(saved.entries), keptCount: 0 }),
    [`GET ${calendarPath}/versions`]: () => list([]),
    [`GET ${communityPath}`]: () => ({
      ...UPPER_TAZIMEL.settings,
      id: CALENDAR.communityId,
      signOffRule: { minElders: 1, mustSign: [], oneOf: [], steward: false },
      version: 1,
    }),
    [`GET ${communityPath}/groups`]: () => list([]),
    [`GET ${communityPath}/people`]: () => list([]),
    [`GET ${communityPath}/places`]: () => list([TAZIMEL]),
    [`GET /api/places/${TAZIMEL.id}/stars`]: () => table,
    [`POST ${calendarPath}/entries`]: ({ body }: Sent) => {
      const added = entryOf(markers, saved.entries.length + 1, body as EntryInput);
      saved.entries = [...saved.entries, added];
      return Response.json(added, { status: 201 });
    },
  };
  for (const { id } of saved.entries) {
    answers[`PUT ${calendarPath}/entries/${id}`] = ({ body }: Sent) => {
      const { content, version } = body as { content: EntryInput; version: number };
      const current = saved.entries.find((entry) => entry.id === id);
      if (current?.version !== version) return refusal('stale', 409, { current, sent: body });
      const next = { ...current, content, version: version + 1 };
      saved.entries = saved.entries.map((entry) => (entry.id === id ? next : entry));
      return next;
    };
    answers[`DELETE ${calendarPath}/entries/${id}`] = () => {
      const gone = saved.entries.find((entry) => entry.id === id);
      if (gone) saved.removed = gone;
      saved.entries = saved.entries.filter((entry) => entry.id !== id);
      return new Response(null, { status: 204 });
    };
    answers[`POST ${calendarPath}/entries/${id}/restore`] = () => {
      const back = saved.removed;
      if (back) saved.entries = [back, ...saved.entries];
      return back;
    };
  }
  return answers;
}

import { isStarLead } from '#shared/calendar/entry-model.js';
import type { Entry, EntryInput } from '#shared/contracts/calendars.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import { contentOf, draftOf, type EntryDraft } from './entry-draft.js';
import { isNewId, type Edits, type EntryEdit } from './kept-edits.js';
import { withAnchors } from './hung-entries.js';
import { previewDates, remembered, withOverlaps, type Markers, type ShownEntry } from './preview-dates.js';
import { signOf, type Signs } from './signs.js';

interface Sources {
  saved: readonly Entry[];
  edits: Edits;
  /** The entry on screen, which may be a new one that nobody wrote to yet. */
  openId: string | null;
  newStart: EntryDraft;
  year: number;
  markers: Markers | null;
  signs: Signs;
}

/** Entries look the same until something about them changes: whoever draws hundreds of them draws only those anew. */
const asSaved = new WeakMap<Entry, ShownEntry>();
const asWritten = new WeakMap<EntryEdit, { from: readonly unknown[]; shown: ShownEntry }>();

/** The entries as they look now: what is saved, with everything over it that is written and not saved. */
export function shownEntries({
  saved,
  edits,
  openId,
  newStart,
  year,
  markers,
  signs,
}: Sources): ShownEntry[] {
  const shown = saved.map((entry): ShownEntry => {
    const edit = edits.get(entry.id);
    if (edit) return written(edit, entry);
    const { id, content, dates } = entry;
    return remembered(asSaved, entry, () => ({ id, saved: entry, content, dates, unsaved: false }));
  });
  const newIds = [...edits.keys()].filter(isNewId);
  if (openId !== null && isNewId(openId) && !newIds.includes(openId)) newIds.push(openId);
  const added = newIds.map((id): ShownEntry => {
    const content = contentOf(edits.get(id)?.draft ?? newStart);
    return { id, saved: null, content, dates: datesOf(content, null), unsaved: edits.has(id) };
  });
  return withOverlaps(withAnchors([...shown, ...added], year));

  function written(edit: EntryEdit, entry: Entry): ShownEntry {
    const from = [entry, year, markers, signs];
    const before = asWritten.get(edit);
    if (before?.from.every((each, index) => each === from[index]) === true) return before.shown;
    const content = contentOf(edit.draft);
    const shown = { id: entry.id, saved: entry, content, dates: datesOf(content, entry), unsaved: true };
    asWritten.set(edit, { from, shown });
    return shown;
  }

  /** While the sky is on its way, an entry that still goes by the same thing keeps its saved sign. */
  function datesOf(content: EntryInput, entry: Entry | null) {
    if (markers === null && isStarLead(content.lead)) return entry?.dates ?? null;
    if (content.lead.type === 'sky' && signOf(signs, content.lead.spec) === null) {
      return entry && sameJson(entry.content.lead, content.lead) ? entry.dates : null;
    }
    return previewDates(content, year, markers, signs);
  }
}

/** Unsaved writing to entries that somebody else took out meanwhile. */
export function orphans(saved: readonly Entry[], edits: Edits): { id: string; edit: EntryEdit }[] {
  const ids = new Set(saved.map(({ id }) => id));
  return [...edits].filter(([id]) => !isNewId(id) && !ids.has(id)).map(([id, edit]) => ({ id, edit }));
}

/** True where somebody saved a newer state than the one that was written over. */
export function isStale(entry: Entry | null, edit: EntryEdit | undefined): boolean {
  return (
    entry !== null && edit !== undefined && edit.baseVersion !== null && edit.baseVersion < entry.version
  );
}

/** What the form shows for an entry. */
export function draftFor(entry: ShownEntry, edits: Edits, newStart: EntryDraft): EntryDraft {
  const edit = edits.get(entry.id);
  if (edit) return edit.draft;
  return entry.saved ? draftOf(entry.saved.content) : newStart;
}

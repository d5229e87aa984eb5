import { seenOf, withSeen } from '#shared/calendar/as-seen.js';
import { anchorOf } from '#shared/calendar/anchors.js';
import type { EntryInput, EntryLead } from '#shared/contracts/calendars.js';
import { EMPTY_RECORD, type EventRecord } from '#shared/contracts/event-record.js';
import type { CopyNote } from '#shared/contracts/imports.js';
import type { SkyFigure } from '#shared/contracts/stars.js';
import type { VersionEntryBody } from '#shared/contracts/versions.js';
import { markerKeyOfLead } from '../calendars/sky-dates.service.js';

export interface CopyFacts {
  /** Of the village that it comes from. */
  figures: readonly SkyFigure[];
  /** Both villages name things in one language. */
  isSameLanguage: boolean;
}

export interface CopiedEntry {
  fromId: string;
  title: string;
  /** Null where it cannot come. */
  content: EntryInput | null;
  notes: CopyNote[];
}

/**
 * A village's entries as another one may begin with them: what is to be done and by which sign. Whose it is, who is named,
 * who may see it, what was agreed, what was checked and what an office set for another place all stay behind.
 */
export function copiedEntries(entries: readonly VersionEntryBody[], facts: CopyFacts): CopiedEntry[] {
  const copied = entries.map((entry) => copiedEntry(entry, facts));
  const coming = new Set(copied.flatMap(({ fromId, content }) => (content === null ? [] : [fromId])));
  for (let before = -1; before !== coming.size;) {
    before = coming.size;
    for (const entry of copied) {
      const anchorId = entry.content && anchorOf(entry.content.lead);
      if (entry.content === null || anchorId === null || coming.has(anchorId)) continue;
      coming.delete(entry.fromId);
      entry.content = null;
      entry.notes.push('anchor-left-out');
    }
  }
  return copied;
}

function copiedEntry({ entryId, content, variants = [] }: VersionEntryBody, facts: CopyFacts): CopiedEntry {
  const { titleVillage, titleOfficer, kind, icon, crop, caution, otherSigns, ifLate } = content;
  const { offsets, protectiveWatch, hasLastDate, record } = content;
  const { lead, note } = leadElsewhere(content.lead, facts.figures);
  const notes: CopyNote[] = note === null ? [] : [note];
  const title = titleOfficer;
  if (lead === null) return { fromId: entryId, title, content: null, notes };
  if (hasLastDate) notes.push('last-date-dropped');
  if (variants.length > 0) notes.push('timings-dropped');
  return {
    ...{ fromId: entryId, title, notes },
    content: {
      ...{ titleVillage: facts.isSameLanguage ? titleVillage : '', titleOfficer, kind, icon, crop },
      ...{ caution, otherSigns, ifLate, offsets, protectiveWatch, lead },
      ...{ hasLastDate: false, lastDate: null, notes: '', giver: '', agreedToPrint: false },
      sharingLevel: kind === 'belief' ? 'elders' : 'village',
      ...(record && { record: recordElsewhere(record) }),
    },
  };
}

function leadElsewhere(
  lead: EntryLead,
  figures: readonly SkyFigure[],
): { lead: EntryLead | null; note: CopyNote | null } {
  // A direction over this skyline is another one elsewhere.
  if (lead.type === 'sky' && (lead.spec.kind === 'sun-azimuth' || lead.spec.kind === 'noon-sun')) {
    return { lead: null, note: 'skyline-left-out' };
  }
  const figure = figures.find(({ key }) => key === markerKeyOfLead(lead));
  if (figure !== undefined) {
    if (figure.indicatorHr === null) return { lead: null, note: 'figure-left-out' };
    const markerKey = `hr${String(figure.indicatorHr)}`;
    return { lead: withSeen(ledBy(lead, markerKey), null), note: 'star-instead-of-figure' };
  }
  return { lead: withSeen(lead, null), note: seenOf(lead) === null ? null : 'seen-dropped' };
}

function ledBy(lead: EntryLead, markerKey: string): EntryLead {
  if (lead.type === 'marker' || lead.type === 'marker-as-seen') return { ...lead, markerKey };
  if (lead.type === 'sky' && 'markerKey' in lead.spec) return { ...lead, spec: { ...lead.spec, markerKey } };
  return lead;
}

/**
 * What and when, the signs and what is to be done early or late: as words of its own, without people. A kind of work that
 * the village named is the built-in one that it behaves like.
 */
function recordElsewhere({ what, when, signs, work }: EventRecord): EventRecord {
  const { inputs, ifEarly, ifLaterStill } = work;
  const { operationWord: _word, ...plainWhat } = what;
  return {
    ...EMPTY_RECORD,
    ...{ what: plainWhat, when },
    signs: { ...signs, list: signs.list.map(({ sharedId: _listed, ownId: _own, ...words }) => words) },
    work: { ...EMPTY_RECORD.work, inputs, ifEarly, ifLaterStill },
  };
}

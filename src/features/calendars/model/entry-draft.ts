import { seenOf, withSeen } from '#shared/calendar/as-seen.js';
import { isStarLead, type StarLead } from '#shared/calendar/entry-model.js';
import type { LeadWay, PlannedDay, SeenDay } from '#shared/contracts/entry-lead.js';
import {
  entryInput,
  type EntryInput,
  type EntryLead,
  type EntryOffsets,
  type FixedLastDate,
} from '#shared/contracts/calendars.js';
import { EMPTY_RECORD, type EventRecord } from '#shared/contracts/event-record.js';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import { sameButForVillageWords } from '#shared/calendar/village-words.js';
import { sameJson } from '#shared/kernel/canonical-json.js';

type MarkerLead = Extract<EntryLead, { type: 'marker' }>;
type SkyLead = Extract<EntryLead, { type: 'sky' }>;
type FixedLead = Extract<EntryLead, { type: 'fixed-date' }>;
type NatureLead = Extract<EntryLead, { type: 'nature-sign' }>;

/**
 * An entry while it is being written. It keeps all ways to lead it, and the last date also while the entry is not
 * marked as having one: a change of mind loses nothing. What is saved is `contentOf(draft)`.
 */
export interface EntryDraft extends Omit<EntryInput, 'lead' | 'lastDate' | 'record'> {
  leadType: LeadWay;
  /** `markerKey` is empty until a star or figure is chosen. */
  marker: Omit<MarkerLead, 'type'>;
  /** Without a star until a sign is chosen; see `hasSign`. Whether its day as seen leads; that day is `seen`. */
  sky: Omit<SkyLead, 'type' | 'seen'> & { seen?: null };
  fixed: Omit<FixedLead, 'type'>;
  /** The day as people saw it this year, where what leads goes as seen. */
  seen: SeenDay | null;
  nature: Omit<NatureLead, 'type'>;
  /** The other entry, and which of its planned days; empty until one is chosen. */
  anchor: { entryId: string; day: PlannedDay };
  lastDate: FixedLastDate;
  /** Empty where nothing of it is said. */
  record: EventRecord;
}

const NO_MARKER: EntryDraft['marker'] = { markerKey: '', phenomenon: 'heliacal-rising', occurrence: 1 };
const NO_SKY: EntryDraft['sky'] = {
  spec: { kind: 'due-meridian', markerKey: '', facing: 'south', solarHour: 21 },
  occurrence: 1,
};
const NO_FIXED: EntryDraft['fixed'] = { date: { month: 1, day: 1 }, source: '' };
const NO_NATURE: EntryDraft['nature'] = {
  name: '',
  usual: { from: { month: 1, day: 1 }, to: { month: 1, day: 31 } },
  source: '',
};
const NO_ANCHOR: EntryDraft['anchor'] = { entryId: '', day: 'bestFrom' };
/** Leads that came after drafts were first kept on devices. */
export const NEWER_LEADS = { seen: null, nature: NO_NATURE, anchor: NO_ANCHOR } satisfies Partial<EntryDraft>;
const FIRST_OFFSETS: EntryOffsets = { earliestDays: 0, bestFromDays: 0, bestToDays: 7, lastAdvisedDays: 14 };

export function draftOf(content: EntryInput): EntryDraft {
  const { lead, lastDate, ...rest } = content;
  return {
    ...rest,
    leadType: lead.type === 'none' ? lead.way : lead.type,
    marker: isStarLead(lead) ? markerOf(lead) : NO_MARKER,
    sky: lead.type === 'sky' ? skyOf(lead) : NO_SKY,
    fixed: lead.type === 'fixed-date' ? withoutType(lead) : NO_FIXED,
    seen: seenOf(lead),
    nature: lead.type === 'nature-sign' ? withoutType(lead) : NO_NATURE,
    anchor: anchorPart(lead),
    lastDate: lastDate ?? NO_FIXED,
    record: content.record ?? EMPTY_RECORD,
    sharing: content.sharing ?? PLAIN_DETAILS,
    giverId: content.giverId ?? null,
  };
}

/** Is a sign of the sky chosen? */
export function hasSign({ spec }: EntryDraft['sky']): boolean {
  return !('markerKey' in spec) || spec.markerKey !== '';
}

/** What leads as it is written, also while nothing is chosen in it. */
export function writtenLead({ leadType, marker, sky, fixed, seen, nature, anchor }: EntryDraft): EntryLead {
  const leads: Record<LeadWay, EntryLead> = {
    marker: { type: 'marker', ...marker },
    sky: withSeen<EntryLead>({ type: 'sky', ...sky }, seen),
    'fixed-date': { type: 'fixed-date', ...fixed },
    'marker-as-seen': { type: 'marker-as-seen', ...marker, seen },
    'nature-sign': { type: 'nature-sign', ...nature },
    'entry-planned': { type: 'entry-planned', ...anchor },
    'entry-actual': { type: 'entry-actual', entryId: anchor.entryId },
  };
  return leads[leadType];
}

/** Is something chosen in the way that is picked? */
function isChosen(draft: EntryDraft): boolean {
  const { marker, sky, fixed, seen, nature, anchor } = draft;
  switch (draft.leadType) {
    case 'marker':
      return marker.markerKey !== '';
    case 'marker-as-seen':
      return marker.markerKey !== '' || seen !== null;
    case 'sky':
      return hasSign(sky);
    case 'fixed-date':
      return !sameJson(fixed, NO_FIXED);
    case 'nature-sign':
      return !sameJson(nature, NO_NATURE);
    case 'entry-planned':
    case 'entry-actual':
      return anchor.entryId !== '';
  }
}

/** What would be saved. It may still be incomplete; the contract's schema says where. */
export function contentOf(draft: EntryDraft): EntryInput {
  const { leadType, marker, sky, fixed, seen, nature, anchor, lastDate, ...said } = draft;
  const { sharing, giverId, record, kindWord, ...rest } = said;
  return {
    ...rest,
    lead: isChosen(draft) ? writtenLead(draft) : { type: 'none', way: leadType },
    lastDate: draft.hasLastDate ? lastDate : null,
    // Left out where they say nothing, so that older texts and their hashes stay as they are.
    ...(sharing && !sameJson(sharing, PLAIN_DETAILS) ? { sharing } : {}),
    ...(giverId ? { giverId } : {}),
    ...(kindWord ? { kindWord } : {}),
    ...(sameJson(record, EMPTY_RECORD) ? {} : { record }),
  };
}

type WantedLead = MarkerLead | Omit<SkyLead, 'seen'>;

/** The part of a draft that a wanted marker sets; without one, a star is still to be chosen. */
function withLead(wanted: WantedLead | null): Pick<EntryDraft, 'leadType' | 'marker' | 'sky'> {
  return { leadType: 'marker', marker: NO_MARKER, sky: NO_SKY, ...(wanted && leadPatch(wanted)) };
}

/** Makes a marker the lead of a draft; what else could lead it stays. */
export function leadPatch(wanted: WantedLead): Partial<Pick<EntryDraft, 'leadType' | 'marker' | 'sky'>> {
  const { type, ...lead } = wanted;
  return 'spec' in lead ? { leadType: type, sky: lead } : { leadType: type, marker: lead };
}

/** A new entry; on the star's page a person may have chosen what it goes by. */
export function newDraft(wanted: WantedLead | null = null): EntryDraft {
  return {
    ...withLead(wanted),
    titleVillage: '',
    titleOfficer: '',
    kind: 'farm',
    icon: 'seed',
    crop: '',
    notes: '',
    caution: '',
    fixed: NO_FIXED,
    ...NEWER_LEADS,
    offsets: FIRST_OFFSETS,
    hasLastDate: false,
    lastDate: NO_FIXED,
    protectiveWatch: false,
    otherSigns: '',
    ifLate: '',
    giver: '',
    agreedToPrint: false,
    sharingLevel: 'village',
    sharing: PLAIN_DETAILS,
    giverId: null,
    record: EMPTY_RECORD,
  };
}

/** A new entry of an elder: what they keep begins with the elders. */
export function keptDraft(wanted: WantedLead | null = null): EntryDraft {
  return { ...newDraft(wanted), kind: 'community', icon: 'community', sharingLevel: 'elders' };
}

/** True where saving the draft would change what is saved. Spaces at the ends do not count. */
export function differsFrom(draft: EntryDraft, saved: EntryInput): boolean {
  return !sameContent(contentOf(draft), saved);
}

export function sameContent(a: EntryInput, b: EntryInput): boolean {
  return sameJson(tidy(a), tidy(b));
}

/** The same for elders: what the village calls a kind or a work is no part of what they were asked. */
export function sameForElders(a: EntryInput, b: EntryInput): boolean {
  return sameButForVillageWords(tidy(a), tidy(b));
}

/** Trimmed and normalised as the server will store it; untouched where it cannot be stored yet. */
function tidy(content: EntryInput): EntryInput {
  const parsed = entryInput.safeParse(content);
  return parsed.success ? parsed.data : content;
}

function markerOf({ markerKey, phenomenon, occurrence }: StarLead): EntryDraft['marker'] {
  return { markerKey, phenomenon, occurrence };
}

function skyOf({ spec, occurrence, seen }: SkyLead): EntryDraft['sky'] {
  return { spec, occurrence, ...(seen === undefined ? {} : { seen: null }) };
}

function anchorPart(lead: EntryLead): EntryDraft['anchor'] {
  if (lead.type === 'entry-planned') return withoutType(lead);
  return lead.type === 'entry-actual' ? { ...NO_ANCHOR, entryId: lead.entryId } : NO_ANCHOR;
}

function withoutType<T extends { type: string }>({ type: _type, ...rest }: T): Omit<T, 'type'> {
  return rest;
}

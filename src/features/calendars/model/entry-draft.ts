import {
  entryInput,
  type EntryInput,
  type EntryLead,
  type EntryOffsets,
  type FixedLastDate,
} from '#shared/contracts/calendars.js';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import { sameJson } from '#shared/kernel/canonical-json.js';

type MarkerLead = Extract<EntryLead, { type: 'marker' }>;
type SkyLead = Extract<EntryLead, { type: 'sky' }>;
type FixedLead = Extract<EntryLead, { type: 'fixed-date' }>;

/**
 * An entry while it is being written. It keeps all ways to lead it, and the last date also while the entry is not
 * marked as having one: a change of mind loses nothing. What is saved is `contentOf(draft)`.
 */
export interface EntryDraft extends Omit<EntryInput, 'lead' | 'lastDate'> {
  leadType: EntryLead['type'];
  /** `markerKey` is empty until a star or figure is chosen. */
  marker: Omit<MarkerLead, 'type'>;
  /** Without a star until a sign is chosen; see `hasSign`. */
  sky: Omit<SkyLead, 'type'>;
  fixed: Omit<FixedLead, 'type'>;
  lastDate: FixedLastDate;
}

const NO_MARKER: EntryDraft['marker'] = { markerKey: '', phenomenon: 'heliacal-rising', occurrence: 1 };
const NO_SKY: EntryDraft['sky'] = {
  spec: { kind: 'due-meridian', markerKey: '', facing: 'south', solarHour: 21 },
  occurrence: 1,
};
const NO_FIXED: EntryDraft['fixed'] = { date: { month: 1, day: 1 }, source: '' };
const FIRST_OFFSETS: EntryOffsets = { earliestDays: 0, bestFromDays: 0, bestToDays: 7, lastAdvisedDays: 14 };

export function draftOf(content: EntryInput): EntryDraft {
  const { lead, lastDate, ...rest } = content;
  return {
    ...rest,
    leadType: lead.type,
    marker: lead.type === 'marker' ? withoutType(lead) : NO_MARKER,
    sky: lead.type === 'sky' ? withoutType(lead) : NO_SKY,
    fixed: lead.type === 'fixed-date' ? withoutType(lead) : NO_FIXED,
    lastDate: lastDate ?? NO_FIXED,
    sharing: content.sharing ?? PLAIN_DETAILS,
    giverId: content.giverId ?? null,
  };
}

/** Is a sign of the sky chosen? */
export function hasSign({ spec }: EntryDraft['sky']): boolean {
  return !('markerKey' in spec) || spec.markerKey !== '';
}

/** What would be saved. It may still be incomplete; the contract's schema says where. */
export function contentOf(draft: EntryDraft): EntryInput {
  const { leadType, marker, sky, fixed, lastDate, sharing, giverId, ...rest } = draft;
  const leads: Record<EntryLead['type'], EntryLead> = {
    marker: { type: 'marker', ...marker },
    sky: { type: 'sky', ...sky },
    'fixed-date': { type: 'fixed-date', ...fixed },
  };
  return {
    ...rest,
    lead: leads[leadType],
    lastDate: draft.hasLastDate ? lastDate : null,
    // Left out where they say nothing, so that older texts and their hashes stay as they are.
    ...(sharing && !sameJson(sharing, PLAIN_DETAILS) ? { sharing } : {}),
    ...(giverId ? { giverId } : {}),
  };
}

type WantedLead = MarkerLead | SkyLead;

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

/** Trimmed and normalised as the server will store it; untouched where it cannot be stored yet. */
function tidy(content: EntryInput): EntryInput {
  const parsed = entryInput.safeParse(content);
  return parsed.success ? parsed.data : content;
}

function withoutType<T extends { type: string }>({ type: _type, ...rest }: T): Omit<T, 'type'> {
  return rest;
}

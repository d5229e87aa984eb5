import type { EntryLead, SeenDay } from './entry-model.js';

/**
 * Leads that are counted from the computed day until people have seen it, and then from the day on which they saw it: a
 * star's first or last day, or another sign of the sky with a place for that day.
 */
export function goesAsSeen(lead: EntryLead): boolean {
  return lead.type === 'marker-as-seen' || (lead.type === 'sky' && lead.seen !== undefined);
}

/** The day on which people saw what leads; null while nobody has, and where none is waited for. */
export function seenOf(lead: EntryLead): SeenDay | null {
  return lead.type === 'marker-as-seen' || lead.type === 'sky' ? (lead.seen ?? null) : null;
}

/** The same lead with another day on which it was seen; as it is where none is waited for. */
export function withSeen<L extends EntryLead>(lead: L, seen: SeenDay | null): L {
  return goesAsSeen(lead) ? { ...lead, seen } : lead;
}

import { seenOf, withSeen } from './as-seen.js';
import type { EntryLead, EntryTiming } from './entry-model.js';

/** On what an entry's days rest, without a word or a name that anybody gave: enough to reckon them anew. */
export function wordlessTiming({
  lead,
  offsets,
  hasLastDate,
  lastDate,
  protectiveWatch,
}: EntryTiming): EntryTiming {
  return {
    kind: '',
    crop: '',
    lead: wordlessLead(lead),
    offsets,
    hasLastDate,
    lastDate: lastDate && { date: lastDate.date, source: '' },
    protectiveWatch,
  };
}

function wordlessLead(lead: EntryLead): EntryLead {
  switch (lead.type) {
    case 'fixed-date':
      return { ...lead, source: '' };
    case 'nature-sign':
      return { ...lead, name: '', source: '' };
    default: {
      const seen = seenOf(lead);
      return withSeen(lead, seen && { date: seen.date, by: '', agreedBy: '' });
    }
  }
}

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
    case 'marker-as-seen':
      return { ...lead, seen: lead.seen && { date: lead.seen.date, by: '', agreedBy: '' } };
    default:
      return lead;
  }
}

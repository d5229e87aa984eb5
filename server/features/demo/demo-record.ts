import type { EntryInput, EntryLead } from '#shared/contracts/calendars.js';
import { EMPTY_RECORD, type EventRecord } from '#shared/contracts/event-record.js';
import type { YearsLine } from './tazimel-2026.data.js';

const OFFICE = 'District agricultural office';
const CHECKED = { office: OFFICE, name: 'M. Terno', day: '2026-02-26' };

/** An entry of the event list as it stood in the year before: a whole record, with signs that can be marked in place of words. */
export function yearsContent(known: EntryInput, line: YearsLine): EntryInput {
  const { kind, lead, crop } = known;
  return {
    ...known,
    lead: yearsLead(lead, line),
    crop: kind === 'farm' && crop === '' ? 'all crops' : crop,
    otherSigns: '',
    record: yearsRecord(known, line),
  };
}

function yearsLead(lead: EntryLead, { seen }: YearsLine): EntryLead {
  if (seen === undefined || lead.type !== 'marker') return lead;
  return { ...lead, type: 'marker-as-seen', seen: null };
}

function yearsRecord(
  { giver }: EntryInput,
  { work, signs, needed, hasMustHave = false }: YearsLine,
): EventRecord {
  const { operation, land, responsible, confidence, leadDays, ifEarly, stop } = work;
  const list = signs.map(({ type, name }) => ({
    ...{ type, name, look: '', where: '', usual: null, stillSeen: null },
  }));
  return {
    ...EMPTY_RECORD,
    what: { ...EMPTY_RECORD.what, operation, land },
    when: { ...EMPTY_RECORD.when, leadDays, graceDays: 5 },
    signs: { list, needed, mustHave: hasMustHave ? 0 : null },
    work: {
      ...EMPTY_RECORD.work,
      ...{ responsible, decides: 'each household for itself', ifEarly, askWhom: OFFICE },
      stop: stop === undefined ? null : { date: { month: stop[0], day: stop[1] }, source: OFFICE },
    },
    trust: { confidence, by: giver, basis: 'handed-down' },
    heard: { where: 'Upper Tazimel', day: '2026-02-20', language: 'Tazimeli' },
    checked: { work: CHECKED, safety: CHECKED, late: CHECKED },
  };
}

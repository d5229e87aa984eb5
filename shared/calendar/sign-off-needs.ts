/**
 * What an event's record must say before elders are asked about it. A draft may lack any of it; which parts are asked for
 * depends on the kind of the event. The codes have words in every language.
 */
export const SIGN_OFF_NEEDS = [
  'titleVillage',
  'operation',
  'crop',
  'land',
  'lead',
  'leadDays',
  'graceDays',
  'signsNeeded',
  'mustHaveSign',
  'responsible',
  'decides',
  'ifEarly',
  'ifLate',
  'stop',
  'askWhom',
  'caution',
  'confidence',
  'confidenceBy',
  'basis',
  'giver',
  'heardWhere',
  'heardDay',
  'heardLanguage',
  'checkedWork',
  'checkedSafety',
  'checkedLate',
] as const;
export type SignOffNeed = (typeof SIGN_OFF_NEEDS)[number];

/** The part of an entry that these rules look at. */
export interface NeedsOfEntry {
  kind: string;
  titleVillage: string;
  crop: string;
  caution: string;
  ifLate: string;
  giver: string;
  lead: { type: string };
  /** Whoever does not want to be named is not asked for a name. */
  sharing?: { naming: string } | undefined;
  record?: NeedsOfRecord | undefined;
}

export interface NeedsOfRecord {
  what: { operation: string | null; land: string };
  when: { leadDays: number | null; graceDays: number | null };
  signs: { needed: number | null; mustHave: number | null };
  work: { responsible: string; decides: string; ifEarly: string; stop: object | null; askWhom: string };
  trust: { confidence: string | null; by: string; basis: string | null };
  heard: { where: string; day: string | null; language: string };
  checked: { work: object | null; safety: object | null; late: object | null };
}

/** Seed that is in the ground cannot be taken back: signs decide, not a day alone. */
const INTO_THE_GROUND: readonly (string | null)[] = ['sow', 'plant', 'gap-fill'];

const NOTHING_SAID: NeedsOfRecord = {
  what: { operation: null, land: '' },
  when: { leadDays: null, graceDays: null },
  signs: { needed: null, mustHave: null },
  work: { responsible: '', decides: '', ifEarly: '', stop: null, askWhom: '' },
  trust: { confidence: null, by: '', basis: null },
  heard: { where: '', day: null, language: '' },
  checked: { work: null, safety: null, late: null },
};

/**
 * What is still to be said, in the order of the form; empty where nothing is missing. An entry of the time before there
 * were records goes on without one as it did, until something of it is said; what its days count from is asked of all.
 */
export function signOffNeeds(entry: NeedsOfEntry, isOlder = false): SignOffNeed[] {
  if (entry.record === undefined && isOlder) return missingLead(entry);
  const record = entry.record ?? NOTHING_SAID;
  const missing = new Set<SignOffNeed>([...missingLead(entry), ...missingOfWhose(entry, record)]);
  if (entry.kind !== 'marker-only') {
    for (const need of missingOfWork(entry, record)) missing.add(need);
  }
  if (entry.kind === 'farm') for (const need of missingOfFarm(entry, record)) missing.add(need);
  if (entry.kind === 'safety' && entry.caution === '') missing.add('caution');
  for (const need of missingOfCheck(entry, record)) missing.add(need);
  return SIGN_OFF_NEEDS.filter((need) => missing.has(need));
}

function missingLead({ lead }: NeedsOfEntry): SignOffNeed[] {
  return lead.type === 'none' ? ['lead'] : [];
}

function missingOfWhose(
  { titleVillage, giver, sharing }: NeedsOfEntry,
  { trust, heard }: NeedsOfRecord,
): SignOffNeed[] {
  const isNamed = (sharing?.naming ?? 'named') === 'named';
  return unsaid({
    titleVillage,
    ...(isNamed ? { giver, confidenceBy: trust.by } : {}),
    confidence: trust.confidence,
    basis: trust.basis,
    heardWhere: heard.where,
    heardDay: heard.day,
    heardLanguage: heard.language,
  });
}

function missingOfWork({ kind, ifLate }: NeedsOfEntry, { when, work }: NeedsOfRecord) {
  const { leadDays, graceDays } = when;
  const { responsible, decides, askWhom, stop, ifEarly } = work;
  const canHurt = kind === 'farm' || kind === 'safety';
  return unsaid({
    ...{ leadDays, graceDays, responsible, decides },
    ...(canHurt ? { ifEarly, ifLate, stop, askWhom } : {}),
  });
}

function missingOfFarm({ crop }: NeedsOfEntry, { what, signs }: NeedsOfRecord) {
  const { operation, land } = what;
  const waits = INTO_THE_GROUND.includes(operation);
  return unsaid({
    ...{ operation, crop, land },
    ...(waits ? { signsNeeded: signs.needed, mustHaveSign: signs.mustHave } : {}),
  });
}

/** Words on which somebody may act and be hurt were read by the responsible office. */
function missingOfCheck({ kind, caution, ifLate }: NeedsOfEntry, { checked }: NeedsOfRecord) {
  return unsaid({
    ...(kind === 'farm' ? { checkedWork: checked.work } : {}),
    ...(caution === '' ? {} : { checkedSafety: checked.safety }),
    ...(ifLate === '' ? {} : { checkedLate: checked.late }),
  });
}

function unsaid(parts: Partial<Record<SignOffNeed, unknown>>): SignOffNeed[] {
  const empty = Object.entries(parts).filter(([, said]) => said === null || said === '');
  return empty.map(([need]) => need as SignOffNeed);
}

/** Who must sign before a submission counts as signed off. */
export interface SignOffRule {
  minElders: number;
  /** All of them. */
  mustSign: readonly string[];
  /** At least one of them, where it names anybody. */
  oneOf: readonly string[];
  steward: boolean;
}

export type SignatureRole = 'elder' | 'steward';

export interface SignatureFact {
  personId: string;
  role: SignatureRole;
}

export interface ReviewedEntry {
  entryId: string;
  hash: string;
}

export interface AnswerFact {
  entryId: string;
  entryHash: string;
  elderId: string;
  answer: 'agree' | 'change-this' | 'not-for-the-board' | 'not-mine-to-say';
  letStand: boolean;
}

/** Everything that decides about a submission in review. */
export interface ReviewState {
  /** As it stood when the draft was submitted. */
  rule: SignOffRule;
  entries: readonly ReviewedEntry[];
  /** Of the calendar; those given to other content are left out here. */
  answers: readonly AnswerFact[];
  signatures: readonly SignatureFact[];
  /** Whoever wrote to the draft since the last published version. */
  writerIds: ReadonlySet<string>;
}

export const PEOPLE_GAPS = ['needs-elders', 'needs-person', 'needs-one-of', 'needs-steward'] as const;
export const ENTRY_GAPS = ['entry-without-agree', 'change-stands', 'not-for-board-stands'] as const;
export type PeopleGapCode = (typeof PEOPLE_GAPS)[number];
export type EntryGapCode = (typeof ENTRY_GAPS)[number];

export interface SignOffGap {
  code: PeopleGapCode | EntryGapCode;
  personIds: string[];
  entryIds: string[];
  /** People or entries that are missing. */
  count: number;
}

/** Everything that still stands between the submission and "signed off"; nobody's silence fills a gap. */
export function signOffGaps(state: ReviewState): SignOffGap[] {
  return [...peopleGaps(state.rule, state.signatures), ...entryGaps(state)];
}

/** Whose signatures the rule still asks for. */
export function peopleGaps(rule: SignOffRule, signatures: readonly SignatureFact[]): SignOffGap[] {
  const signed = new Set(signatures.map(({ personId }) => personId));
  const elders = new Set(signatures.filter(({ role }) => role === 'elder').map(({ personId }) => personId));
  const gaps: SignOffGap[] = [];
  const missing = rule.mustSign.filter((personId) => !signed.has(personId));
  if (elders.size < rule.minElders) gaps.push(gap('needs-elders', [], [], rule.minElders - elders.size));
  if (missing.length > 0) gaps.push(gap('needs-person', missing, [], missing.length));
  if (rule.oneOf.length > 0 && !rule.oneOf.some((personId) => signed.has(personId))) {
    gaps.push(gap('needs-one-of', [...rule.oneOf], [], 1));
  }
  if (rule.steward && !signatures.some(({ role }) => role === 'steward')) {
    gaps.push(gap('needs-steward', [], [], 1));
  }
  return gaps;
}

/**
 * Which entries keep the submission from being signed off. An objection counts whoever gave it, until its elder
 * lets the difference stand or the officer takes the entry out; an *agree* of somebody who wrote to the draft does
 * not count, because whoever compiles does not confirm.
 */
export function entryGaps({
  entries,
  answers,
  writerIds,
}: Omit<ReviewState, 'rule' | 'signatures'>): SignOffGap[] {
  const withoutAgree: string[] = [];
  const changeStands: string[] = [];
  const notForBoard: string[] = [];
  const byEntry = answersByEntry(entries, answers);
  for (const { entryId } of entries) {
    const given = byEntry.get(entryId) ?? [];
    if (!given.some(({ answer, elderId }) => answer === 'agree' && !writerIds.has(elderId))) {
      withoutAgree.push(entryId);
    }
    if (given.some(({ answer, letStand }) => answer === 'change-this' && !letStand))
      changeStands.push(entryId);
    if (given.some(({ answer }) => answer === 'not-for-the-board')) notForBoard.push(entryId);
  }
  return [
    ...entryGap('entry-without-agree', withoutAgree),
    ...entryGap('change-stands', changeStands),
    ...entryGap('not-for-board-stands', notForBoard),
  ];
}

/** Whose word a kept entry waits for: it is answered by its own people, apart from the village's sign-off. */
export interface KeptEntry extends ReviewedEntry {
  /** Who wrote it last: somebody else of its people agrees. */
  writerId: string;
  /** Giver and successor, where at some time of the year nobody else may see it: either's own word is enough then. */
  ownPeople: ReadonlySet<string>;
}

/** Does a kept entry belong to a published version? Its people agreed to it, and none of them objects. */
export function keptEntryStands(entry: KeptEntry, answers: readonly AnswerFact[]): boolean {
  const given = answersByEntry([entry], answers).get(entry.entryId) ?? [];
  const agreed = given.some(
    ({ answer, elderId }) =>
      answer === 'agree' && (elderId !== entry.writerId || entry.ownPeople.has(elderId)),
  );
  const opposed = given.some(
    ({ answer, letStand }) => answer === 'not-for-the-board' || (answer === 'change-this' && !letStand),
  );
  return agreed && !opposed;
}

export type EntryOutcome =
  'with-reviewers' | 'changes-asked' | 'held-back' | 'agreed' | 'agreed-with-differences';

/**
 * Where one entry stands. Differences that its people let stand, or variants beside it, make "agreed with differences":
 * a full outcome, not half of one. Nothing is counted and nobody is outvoted.
 */
export function entryOutcome(
  entry: ReviewedEntry,
  answers: readonly AnswerFact[],
  writerIds: ReadonlySet<string>,
  hasVariants: boolean,
): EntryOutcome {
  const given = answersByEntry([entry], answers).get(entry.entryId) ?? [];
  if (given.some(({ answer }) => answer === 'not-for-the-board')) return 'held-back';
  const asked = given.filter(({ answer }) => answer === 'change-this');
  if (asked.some(({ letStand }) => !letStand)) return 'changes-asked';
  if (!given.some(({ answer, elderId }) => answer === 'agree' && !writerIds.has(elderId)))
    return 'with-reviewers';
  return asked.length > 0 || hasVariants ? 'agreed-with-differences' : 'agreed';
}

/** How many entries of the submission an elder has answered, by themselves or through somebody who wrote it down. */
export function answeredCount(
  elderId: string,
  entries: readonly ReviewedEntry[],
  answers: readonly AnswerFact[],
): number {
  const hashes = new Set(entries.map(keyOf));
  return new Set(
    answers
      .filter((answer) => answer.elderId === elderId && hashes.has(keyOfAnswer(answer)))
      .map(keyOfAnswer),
  ).size;
}

/** Why somebody who holds the role cannot sign now; null where they can. */
export type SigningObstacle =
  'not-in-review' | 'already-signed' | 'wrote-the-draft' | 'answers-missing' | 'something-stands' | null;

/**
 * May this person sign in this role? They hold the role; whether they do is not asked here.
 *
 * A submission becomes signed off in the act of signing and in no other: answers never move the state. The signature
 * that would complete the rule is therefore taken only once nothing stands against any entry (`something-stands`
 * until then). So at every moment of a review somebody of the rule is still to sign, and nobody has to sign twice.
 */
export function signingObstacle(
  person: SignatureFact,
  state: ReviewState,
  inReview: boolean,
): SigningObstacle {
  if (!inReview) return 'not-in-review';
  if (state.signatures.some(({ personId, role }) => personId === person.personId && role === person.role)) {
    return 'already-signed';
  }
  if (state.writerIds.has(person.personId)) return 'wrote-the-draft';
  if (
    person.role === 'elder' &&
    answeredCount(person.personId, state.entries, state.answers) < state.entries.length
  ) {
    return 'answers-missing';
  }
  const completesRule = peopleGaps(state.rule, [...state.signatures, person]).length === 0;
  return completesRule && entryGaps(state).length > 0 ? 'something-stands' : null;
}

function answersByEntry(
  entries: readonly ReviewedEntry[],
  answers: readonly AnswerFact[],
): Map<string, AnswerFact[]> {
  const hashes = new Set(entries.map(keyOf));
  const byEntry = new Map<string, AnswerFact[]>();
  for (const answer of answers) {
    if (!hashes.has(keyOfAnswer(answer))) continue;
    const given = byEntry.get(answer.entryId);
    if (given) given.push(answer);
    else byEntry.set(answer.entryId, [answer]);
  }
  return byEntry;
}

function keyOf({ entryId, hash }: ReviewedEntry): string {
  return `${entryId} ${hash}`;
}

function keyOfAnswer({ entryId, entryHash }: AnswerFact): string {
  return `${entryId} ${entryHash}`;
}

function entryGap(code: EntryGapCode, entryIds: string[]): SignOffGap[] {
  return entryIds.length > 0 ? [gap(code, [], entryIds, entryIds.length)] : [];
}

function gap(code: SignOffGap['code'], personIds: string[], entryIds: string[], count: number): SignOffGap {
  return { code, personIds, entryIds, count };
}

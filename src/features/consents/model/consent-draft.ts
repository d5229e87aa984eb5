import { addMonths, format, parseISO } from 'date-fns';
import {
  CONSENT_USES,
  consentContent,
  REVIEW_MONTHS,
  type ConsentContent,
  type ItemConsents,
} from '#shared/contracts/consents.js';

/** What a form holds: a consent in which the answer and the proof may still be missing. */
export type ConsentDraft = Omit<ConsentContent, 'answer'> & { answer: ConsentContent['answer'] | null };

/** Nothing is ticked and nothing is chosen; the day is today, the next asking a year on. */
export function blankConsent(
  thing: Pick<ItemConsents, 'giverId' | 'giverName'>,
  today: string,
): ConsentDraft {
  return {
    answer: null,
    givenAs: 'person',
    giverId: thing.giverId,
    giverName: thing.giverName,
    spokeFor: '',
    askedOn: today,
    askedWhere: '',
    language: null,
    askedHow: [],
    explainedBy: '',
    explanation: '',
    proof: null,
    uses: [],
    naming: null,
    conditions: '',
    benefits: '',
    until: null,
    reviewBy: yearAfter(today),
    afterDeath: null,
    passTo: '',
    mayWithdraw: [],
  };
}

/** Asked again: who and how stay as they were. Every yes is asked for anew, so no tick stands before it is said. */
export function askedAgain(content: ConsentContent, today: string): ConsentDraft {
  return {
    ...content,
    answer: null,
    askedOn: today,
    reviewBy: yearAfter(today),
    until: null,
    proof: null,
    uses: [],
    naming: null,
  };
}

export function yearAfter(day: string): string {
  return format(addMonths(parseISO(day), REVIEW_MONTHS), 'yyyy-MM-dd');
}

/** Ticks are asked for with a yes only; a changed mind keeps them in the form and sends none. */
export function isYes(answer: ConsentDraft['answer']): boolean {
  return answer === 'given' || answer === 'given-with-conditions';
}

/** The first code at each field that is not right yet, by the path with dots. */
export function problemsOf(draft: ConsentDraft): Map<string, string> {
  const result = consentContent.safeParse(toSend(draft));
  const problems = new Map<string, string>();
  for (const { path, message } of result.error?.issues ?? []) {
    const field = path.join('.');
    if (!problems.has(field)) problems.set(field, field === 'answer' ? 'required' : message);
  }
  return problems;
}

export function toSend(draft: ConsentDraft): ConsentContent {
  const content = {
    ...draft,
    uses: isYes(draft.answer) ? CONSENT_USES.filter((use) => draft.uses.includes(use)) : [],
  };
  return content as ConsentContent;
}

/** A draft that an older release kept may have another shape and is left alone. */
export function isDraft(value: unknown): value is ConsentDraft {
  if (typeof value !== 'object' || value === null) return false;
  const draft = value as Partial<ConsentDraft>;
  return Array.isArray(draft.uses) && Array.isArray(draft.askedHow) && typeof draft.giverName === 'string';
}

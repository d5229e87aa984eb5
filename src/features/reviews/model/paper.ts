import type { PaperAnswer } from '#shared/contracts/meetings.js';
import { ANSWERS, type Answer, type AnswerWord } from '#shared/contracts/reviews.js';

/** What was typed from a paper so far. Keys are elder and entry. */
export interface Paper {
  heldOn: string;
  witness: string;
  marks: Record<string, { answer: AnswerWord | ''; note: string }>;
}

export const EMPTY_PAPER: Paper = { heldOn: '', witness: '', marks: {} };

export function markKey(elderId: string, entryId: string): string {
  return `${elderId} ${entryId}`;
}

export function isPaper(value: unknown): value is Paper {
  if (typeof value !== 'object' || value === null) return false;
  const { heldOn, witness, marks } = value as Partial<Record<keyof Paper, unknown>>;
  return (
    typeof heldOn === 'string' && typeof witness === 'string' && typeof marks === 'object' && marks !== null
  );
}

/** A row without a mark is no answer. */
export function marksOf({ marks }: Paper): PaperAnswer[] {
  return Object.entries(marks).flatMap(([key, { answer, note }]) => {
    const [elderId = '', entryId = ''] = key.split(' ');
    const word = ANSWERS.find((each) => each === answer);
    return word === undefined ? [] : [{ elderId, entryId, answer: word, note: note.trim() }];
  });
}

/** What elders gave with their own hand stays as it is: there is nothing to type. */
export function ownAnswers(given: readonly Answer[]): Map<string, Answer> {
  return new Map(
    given
      .filter(({ recordedByName }) => recordedByName === null)
      .map((answer) => [markKey(answer.elderId, answer.entryId), answer]),
  );
}

import type { AnswerInput, AnswerProofKind } from '#shared/contracts/reviews.js';
import { hasRole, type Actor } from '../../http/actor.js';
import { AppError } from '../../http/app-error.js';

/** Whose word an answer is, whose hand wrote it, and why that counts. */
export interface Hand {
  elderId: string;
  /** Null where the elder's own hand gives it. */
  recordedBy: string | null;
  proof: AnswerProofKind | null;
  witness: string | null;
}

/**
 * Elders answer for themselves. Another hand needs a proof: the elder's PIN or voice for this one answer; before a
 * named witness for an officer or the steward; and for whoever helps an elder who showed their PIN when the helping
 * began, that PIN, except for "agree", which is always proved by itself.
 */
export function handOf(
  actor: Actor,
  input: Omit<AnswerInput, 'pin'>,
  has: { pin: boolean; voice: boolean },
): Hand {
  const { person, helper } = actor;
  const elderId = input.onBehalfOf ?? person.id;
  if (helper === undefined && elderId === person.id) {
    if (!hasRole(actor, 'elder')) throw new AppError('not-allowed');
    return { elderId, recordedBy: null, proof: null, witness: null };
  }
  // While somebody helps one elder, nothing is written for another one.
  if (helper !== undefined && elderId !== person.id) throw new AppError('not-allowed');
  const recordedBy = helper?.id ?? person.id;
  const proved = (proof: AnswerProofKind, witness: string | null = null) => ({
    ...{ elderId, recordedBy, proof, witness },
  });
  if (has.voice) return proved('voice');
  if (has.pin) return proved('pin');
  if (helper !== undefined) {
    if (helper.shownPin && input.answer !== 'agree') return proved('shown-pin');
    throw new AppError('not-allowed', { reason: 'proof-needed' });
  }
  if (!hasRole(actor, 'officer', 'steward')) throw new AppError('not-allowed');
  return proved('witness', input.witness);
}

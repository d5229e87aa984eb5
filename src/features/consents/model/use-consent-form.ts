import { useState } from 'react';
import { consent as consentSchema, type Consent } from '#shared/contracts/consents.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { useKeptDraft } from '#src/lib/kept-draft.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useVoiceClip, type VoiceClip } from '#src/lib/voice-clip.js';
import { useSaveConsent, type ThingRef } from '../api/consents-api.js';
import { isDraft, isYes, problemsOf, toSend, type ConsentDraft } from './consent-draft.js';

export interface ConsentForm {
  draft: ConsentDraft;
  change: (changed: Partial<ConsentDraft>) => void;
  /** The sentence at a field, or undefined while all is well. */
  at: (field: string) => string | undefined;
  overall: string | undefined;
  /** What somebody else wrote meanwhile; saving once more puts this one in its place. */
  newer: Consent | null;
  /** A clip of their voice, which goes with the form as its proof. */
  voice: VoiceClip;
  busy: boolean;
  save: (onDone: () => void) => Promise<void>;
  drop: () => void;
}

export function useConsentForm(thing: ThingRef, over: Consent | null, start: ConsentDraft): ConsentForm {
  const words = useProblemWords();
  const saving = useSaveConsent(thing);
  const kept = useKeptDraft(`consent.${thing.itemId}.${over?.id ?? 'new'}`, isDraft);
  const [draft, setDraft] = useState(kept.found?.value ?? start);
  const [said, setSaid] = useState<ReadonlyMap<string, string>>(new Map());
  const [newer, setNewer] = useState<Consent | null>(null);

  const voice = useVoiceClip();

  const change = (changed: Partial<ConsentDraft>) => {
    const next = { ...draft, ...changed };
    setDraft(next);
    setSaid(new Map([...said].filter(([field]) => !((field.split('.')[0] ?? '') in changed))));
    kept.keepDraft(next, over?.version ?? null);
  };
  const save = async (onDone: () => void) => {
    const clip = draft.proof?.kind === 'voice' && isYes(draft.answer) ? voice.clip : null;
    const problems = problemsOf(clip === null ? draft : { ...draft, proof: null });
    setSaid(new Map([...problems].map(([field, code]) => [field, words.field(code)])));
    if (problems.size > 0) return;
    try {
      await saving.mutateAsync({ content: toSend(draft), over: newer ?? over, clip });
      kept.dropDraft();
      voice.drop();
      onDone();
    } catch (cause) {
      const current =
        cause instanceof ApiProblem && cause.slug === 'stale' ? consentSchema.safeParse(cause.current) : null;
      if (current?.success) setNewer(current.data);
      else setSaid(refusals(cause));
    }
  };
  const refusals = (cause: unknown): ReadonlyMap<string, string> => {
    const errors = cause instanceof ApiProblem ? cause.errors : [];
    if (errors.length === 0) return new Map([['', words.problem(cause)]]);
    return new Map(
      errors.map(({ field, code, message }) => [
        field.replace(/^content\./u, ''),
        words.field(code, message),
      ]),
    );
  };
  return {
    draft,
    change,
    at: (field) => [...said].find(([path]) => path === field || path.startsWith(`${field}.`))?.[1],
    overall: said.get(''),
    newer,
    voice,
    busy: saving.isPending,
    save,
    drop: kept.dropDraft,
  };
}

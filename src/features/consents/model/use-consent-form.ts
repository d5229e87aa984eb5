import { useState } from 'react';
import { consent as consentSchema, type Consent } from '#shared/contracts/consents.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { useKeptDraft } from '#src/lib/kept-draft.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useSaveConsent, type ThingRef } from '../api/consents-api.js';
import { isDraft, problemsOf, toSend, type ConsentDraft } from './consent-draft.js';

export interface ConsentForm {
  draft: ConsentDraft;
  change: (changed: Partial<ConsentDraft>) => void;
  /** The sentence at a field, or undefined while all is well. */
  at: (field: string) => string | undefined;
  overall: string | undefined;
  /** What somebody else wrote meanwhile; saving once more puts this one in its place. */
  newer: Consent | null;
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

  const change = (changed: Partial<ConsentDraft>) => {
    const next = { ...draft, ...changed };
    setDraft(next);
    setSaid(new Map([...said].filter(([field]) => !((field.split('.')[0] ?? '') in changed))));
    kept.keepDraft(next, over?.version ?? null);
  };
  const save = async (onDone: () => void) => {
    const problems = problemsOf(draft);
    setSaid(new Map([...problems].map(([field, code]) => [field, words.field(code)])));
    if (problems.size > 0) return;
    try {
      await saving.mutateAsync({ content: toSend(draft), over: newer ?? over });
      kept.dropDraft();
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
    busy: saving.isPending,
    save,
    drop: kept.dropDraft,
  };
}

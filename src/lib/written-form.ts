import { useState } from 'react';
import type { z } from 'zod';
import { ApiProblem } from './api-problem.js';
import { useProblemWords } from './problem-words.js';

/** What somebody writes before it is sent, with what has to be put right at its fields. */
export interface WrittenForm<T> {
  written: T;
  set: (patch: Partial<T>) => void;
  /** What is the matter with a field, as a sentence. */
  at: (field: string) => string | undefined;
  /** As it is sent; null where something has to be put right, which then stands at its field. */
  checked: () => T | null;
  /** Puts a refusal at its fields. @returns the sentence for the whole form, null where the fields say it */
  refuse: (cause: unknown) => string | null;
}

/** For forms of a few fields that no library keeps: nothing typed is lost by a refusal. */
export function useWrittenForm<T extends object>(schema: z.ZodType<T>, start: T | (() => T)): WrittenForm<T> {
  const words = useProblemWords();
  const [written, setWritten] = useState(start);
  const [problems, setProblems] = useState<ReadonlyMap<string, string>>(new Map());
  return {
    written,
    set: (patch) => {
      setWritten((before) => ({ ...before, ...patch }));
    },
    at: (field) => problems.get(field),
    checked: () => {
      const parsed = schema.safeParse(written);
      const issues = parsed.success ? [] : parsed.error.issues;
      setProblems(new Map(issues.map(({ path, message }) => [path.join('.'), words.field(message)])));
      return parsed.success ? parsed.data : null;
    },
    refuse: (cause) => {
      const errors = cause instanceof ApiProblem ? cause.errors : [];
      setProblems(new Map(errors.map(({ field, code, message }) => [field, words.field(code, message)])));
      return errors.length > 0 ? null : words.problem(cause);
    },
  };
}

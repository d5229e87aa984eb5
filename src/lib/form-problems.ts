import { useCallback } from 'react';
import type { FieldErrors, FieldPath, FieldValues, UseFormReturn } from 'react-hook-form';
import { ApiProblem } from './api-problem.js';
import { useProblemWords } from './problem-words.js';

/** What a form needs to show refusals at their fields and keep everything that was typed. */
export interface FormProblems<T extends FieldValues> {
  /** The sentence for one field, or undefined: hand it to a field's `problem`. */
  at: (field: FieldPath<T>) => string | undefined;
  /** The sentence over the whole form, or undefined. */
  overall: string | undefined;
  /** Puts a thrown refusal where it belongs; call it in `catch`. */
  show: (cause: unknown) => void;
}

/**
 * Joins react-hook-form with the API's refusals. Schemas put a code where a sentence would stand; here each
 * code becomes a sentence. `fields` are those the form shows: a refusal of any other field stands over the form.
 */
export function useFormProblems<T extends FieldValues, C, O>(
  form: UseFormReturn<T, C, O>,
  fields: readonly FieldPath<T>[],
): FormProblems<T> {
  const words = useProblemWords();
  const { errors } = form.formState;
  const { setError } = form;

  const show = useCallback(
    (cause: unknown) => {
      const refused = cause instanceof ApiProblem ? cause.errors : [];
      let focused = false;
      let elsewhere = refused.length === 0 ? words.problem(cause) : undefined;
      for (const { field, code, message } of refused) {
        const own = fields.find((name) => name === field || field.startsWith(`${name}.`));
        if (own === undefined) {
          elsewhere ??= words.field(code, message);
          continue;
        }
        setError(own, { type: 'server', message: words.field(code, message) }, { shouldFocus: !focused });
        focused = true;
      }
      if (elsewhere !== undefined) setError('root', { type: 'server', message: elsewhere });
    },
    [fields, setError, words],
  );

  const at = (field: FieldPath<T>) => {
    const found = errorAt(errors, field);
    if (found === undefined) return undefined;
    return found.type === 'server' ? found.message : words.field(found.message ?? 'unknown');
  };

  return { at, overall: errors.root?.message, show };
}

interface OneError {
  type: string | number;
  message?: string;
}

/** The first error at or below a path: an error of one list item stands at the list's field. */
function errorAt(errors: FieldErrors, path: string): OneError | undefined {
  let node: unknown = errors;
  for (const key of path.split('.')) {
    if (typeof node !== 'object' || node === null) return undefined;
    node = (node as Record<string, unknown>)[key];
  }
  return firstError(node);
}

function firstError(node: unknown): OneError | undefined {
  if (typeof node !== 'object' || node === null) return undefined;
  const { type, message, ref: _ref, ...rest } = node as Record<string, unknown>;
  if (typeof type === 'string') return typeof message === 'string' ? { type, message } : { type };
  for (const child of Object.values(rest)) {
    const found = firstError(child);
    if (found) return found;
  }
  return undefined;
}

import { useCallback } from 'react';
import { useTranslation } from 'react-i18next';
import { listWords } from './list-words.js';
import { ApiProblem } from './api-problem.js';

/** Sentences for problems and field codes: what happened, what is safe, what to do. */
export interface ProblemWords {
  /** One sentence for anything that was thrown. */
  problem: (cause: unknown) => string;
  /** One sentence for a code at a field; `fallback` is the server's own sentence. */
  field: (code: string, fallback?: string) => string;
}

export function useProblemWords(): ProblemWords {
  const { t, i18n } = useTranslation('problems');
  const problem = useCallback(
    (cause: unknown) => {
      if (!(cause instanceof ApiProblem)) return t('type.unknown');
      if (cause.slug === 'too-many-attempts' && cause.retryAfterS !== undefined) {
        return t('waitMinutes', { count: Math.ceil(cause.retryAfterS / 60) });
      }
      const named = `named.${cause.reason ?? ''}`;
      if (cause.names.length > 0 && i18n.exists(named, { ns: 'problems' })) {
        const names = listWords(cause.names, i18n.language);
        return t(named as 'named.record-incomplete', { names });
      }
      const reason = cause.reason === undefined ? null : `reason.${cause.reason}`;
      if (reason !== null && i18n.exists(reason, { ns: 'problems' })) return t(reason as 'type.unknown');
      const key = `type.${cause.slug}`;
      return i18n.exists(key, { ns: 'problems' }) ? t(key as 'type.unknown') : t('type.unknown');
    },
    [t, i18n],
  );
  const field = useCallback(
    (code: string, fallback?: string) => {
      const key = `field.${code}`;
      if (i18n.exists(key, { ns: 'problems' })) return t(key as 'field.unknown');
      return fallback ?? t('field.unknown');
    },
    [t, i18n],
  );
  return { problem, field };
}

import { Trans, useTranslation } from 'react-i18next';
import type { Sentence } from '../model/entry-sentences.js';

/** One sentence about a difference; what is new in it stands out. */
export function SentenceLine({ sentence }: { sentence: Sentence }) {
  const { t } = useTranslation('versions');
  const { count } = sentence.values;
  return (
    <Trans
      t={t}
      // The model only makes keys of this namespace; Trans wants the literal one.
      i18nKey={sentence.key as 'sentence.title'}
      values={{ before: '', after: '', ...sentence.values }}
      {...(typeof count === 'number' ? { count } : {})}
      components={{ 1: <strong />, 3: <strong /> }}
    />
  );
}

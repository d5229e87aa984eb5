import { useTranslation } from 'react-i18next';
import type { Consent } from '#shared/contracts/consents.js';
import { useDateWords } from '#src/lib/date-words.js';
import { listWords } from '#src/lib/list-words.js';

export interface ConsentFact {
  name: string;
  value: string;
}

/** What was agreed besides the uses, as name and words; what nobody said is left out. */
export function useConsentFacts(): (consent: Consent) => ConsentFact[] {
  const { t, i18n } = useTranslation('consents');
  const dates = useDateWords();
  const list = (values: readonly string[]) => listWords(values, i18n.language);
  return ({ content, state }) => {
    const { proof, askedWhere, afterDeath, passTo, mayWithdraw } = content;
    const day = dates.day(content.askedOn, 'year');
    const proofWords = proof === null ? '' : t(`proof.${proof.kind}`);
    const isYes = state === 'given' || state === 'given-with-conditions' || state === 'lapsed';
    const facts: ConsentFact[] = [
      { name: t('fact.conditions'), value: content.conditions },
      { name: t('fact.spokeFor'), value: content.spokeFor },
      { name: t('fact.asked'), value: askedWhere === '' ? day : t('fact.dayAt', { day, place: askedWhere }) },
      { name: t('fact.askedHow'), value: list(content.askedHow.map((way) => t(`way.${way}`))) },
      {
        name: t('fact.explainedBy'),
        value: [content.explainedBy, content.explanation].filter((text) => text !== '').join(', '),
      },
      {
        name: t('fact.proof'),
        value:
          proof === null || proof.witness === ''
            ? proofWords
            : t('proof.withWitness', { proof: proofWords, witness: proof.witness }),
      },
    ];
    const agreed: ConsentFact[] = [
      { name: t('fact.naming'), value: t(`naming.${content.naming ?? 'not-named'}`) },
      { name: t('fact.benefits'), value: content.benefits },
      {
        name: t('fact.until'),
        value: content.until === null ? t('fact.untilOpen') : dates.day(content.until, 'year'),
      },
      { name: t('fact.reviewBy'), value: dates.day(content.reviewBy, 'year') },
      {
        name: t('fact.afterDeath'),
        value:
          afterDeath === null
            ? t('fact.nothingSaid')
            : afterDeath === 'pass-to'
              ? t('afterDeath.passTo', { name: passTo })
              : t(`afterDeath.${afterDeath}`),
      },
      {
        name: t('fact.mayWithdraw'),
        value: list([t('fact.giverAlways'), ...mayWithdraw.map((who) => t(`withdrawer.${who}`))]),
      },
    ];
    return [...facts, ...(isYes ? agreed : [])].filter(({ value }) => value !== '');
  };
}

import { CONSENT_USES, type Consent } from '#shared/contracts/consents.js';
import { GIVER_BY_ROLE } from '#shared/contracts/sharing.js';
import type { ConsentCardModel } from '#shared/sheet/consent-card.js';
import { dayInWords } from '../../print/day-in-words.js';
import { translatorFor, type Translate } from '../../print/translator.js';

/** A consent as everything that its printed card says, in one language. */
export function toConsentCard(consent: Consent, communityName: string, language: string): ConsentCardModel {
  const t = translatorFor(language, 'consents');
  const { content } = consent;
  const day = (iso: string) => dayInWords(iso, language);
  const list = (words: readonly string[]) => new Intl.ListFormat(language).format(words);
  const item = t(`item.${consent.itemType}`);
  return {
    title: t('card.title'),
    under: [
      t('card.copy', { name: nameOf(content.giverName, t) }),
      consent.title === null
        ? t('card.aboutKept', { item })
        : t('card.about', { thing: t('sheet.about', { item, title: consent.title }) }),
      ...(content.spokeFor === '' ? [] : [`${t('fact.spokeFor')}: ${content.spokeFor}`]),
    ],
    asked: askedOf(consent, t, day),
    uses: CONSENT_USES.map((use) => {
      const isYes = content.uses.includes(use);
      return { words: t(isYes ? 'card.yes' : 'card.no', { use: t(`use.${use}.name`) }), isYes };
    }),
    rules: [
      t('card.naming', { naming: t(`naming.${content.naming ?? 'not-named'}`) }),
      ...(content.conditions === '' ? [] : [t('card.conditions', { conditions: content.conditions })]),
      ...(content.benefits === '' ? [] : [t('card.benefits', { benefits: content.benefits })]),
      `${content.until === null ? t('card.untilOpen') : t('card.until', { day: day(content.until) })} ${t('card.review', { day: day(content.reviewBy) })}`,
      ...(content.afterDeath === null ? [] : [t('card.afterDeath', { what: afterDeathOf(consent, t) })]),
    ],
    withdraw: [
      t('card.withdraw'),
      ...(content.mayWithdraw.length === 0
        ? []
        : [
            t('card.withdrawers', {
              who: list(content.mayWithdraw.map((who) => t(`withdrawer.${who}`))),
            }),
          ]),
    ],
    lines: [t('card.mark'), t('card.witness')],
    foot: t('card.foot', { community: communityName }),
  };
}

function nameOf(giverName: string, t: Translate): string {
  return giverName === '' || giverName === GIVER_BY_ROLE ? t('card.unnamed') : giverName;
}

function askedOf({ content, state }: Consent, t: Translate, day: (iso: string) => string): string[] {
  const { askedOn, askedWhere, explainedBy, explanation } = content;
  return [
    askedWhere === ''
      ? t('card.asked', { day: day(askedOn) })
      : t('card.askedAt', { day: day(askedOn), place: askedWhere }),
    ...(explainedBy === ''
      ? []
      : [t(explanation === '' ? 'card.explained' : 'card.explainedAs', { name: explainedBy, explanation })]),
    t('card.answer', { state: t(`state.${state}`) }),
  ];
}

function afterDeathOf({ content: { afterDeath, passTo } }: Consent, t: Translate): string {
  return afterDeath === 'pass-to' ? t('afterDeath.passTo', { name: passTo }) : t(`afterDeath.${afterDeath}`);
}

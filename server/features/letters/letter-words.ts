import type { LetterKind } from '../../db/entities/letter.entity.js';
import { escapeHtml } from '../../mail/escape-html.js';
import type { Translate } from '../../print/translator.js';

export interface LetterFacts {
  kind: LetterKind;
  name: string;
  village: string;
  /** Things that wait; for a digest. */
  count: number;
  link: string;
  choiceLink: string;
}

/** Subject and words of a letter: only that something waits, and a link. */
export function letterWords(
  t: Translate,
  facts: LetterFacts,
): { subject: string; text: string; html: string } {
  const { kind, name, village, count, link, choiceLink } = facts;
  const greeting = t('letter.greeting', { name });
  const line = t(`letter.${kind}.line`, { village, count });
  const footer = t('letter.footer', { link: choiceLink });
  const address = escapeHtml(link);
  return {
    subject: t(`letter.${kind}.subject`, { village, count }),
    text: `${greeting}\n\n${line}\n\n${link}\n\n${footer}\n`,
    html: [
      `<p>${escapeHtml(greeting)}</p>`,
      `<p>${escapeHtml(line)}</p>`,
      `<p><a href="${address}">${escapeHtml(t('letter.open'))}</a><br>${address}</p>`,
      `<p>${escapeHtml(footer)}</p>`,
    ].join('\n'),
  };
}

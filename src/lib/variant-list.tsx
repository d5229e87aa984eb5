import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import type { FrozenVariant } from '#shared/contracts/variants.js';
import { Chip } from '#src/ui/chip.js';
import { Well } from '#src/ui/surfaces.js';
import { useEntryWords, type NamesByKey } from './entry-words.js';
import { useGiverWords } from './giver-words.js';
import { useSharingWords } from './sharing-words.js';

export interface VariantListProps<V extends FrozenVariant> {
  variants: readonly V[];
  year: number;
  markers: NamesByKey;
  /** What a person may do with one of them. */
  actions?: ((variant: V) => ReactNode) | undefined;
}

/** Other keepers' timings to be read, each whole and under its own giver, in the order in which they came. */
export function VariantList<V extends FrozenVariant>({
  variants,
  year,
  markers,
  actions,
}: VariantListProps<V>) {
  const { t } = useTranslation('variants');
  const words = useEntryWords();
  const giverWords = useGiverWords();
  const sharing = useSharingWords();
  return (
    <ul className="grid gap-3">
      {variants.map((variant) => {
        const { content, dates, variantId } = variant;
        const isObjection = content.difference === 'not-on-a-board';
        return (
          <li key={variantId}>
            <Well className="grid gap-1">
              <p className="font-semibold">
                {content.giver === ''
                  ? t('countsUnnamed')
                  : t('counts', { giver: giverWords(content.giver) })}
              </p>
              {!isObjection && (
                <>
                  <p>{words.leadAlone(content, markers)}</p>
                  <p>{dates.window ? words.windowSentence(dates.window) : t('noDays', { year })}</p>
                </>
              )}
              {content.otherSigns !== '' && <p className="whitespace-pre-line">{content.otherSigns}</p>}
              {content.note !== '' && <p className="whitespace-pre-line">{content.note}</p>}
              <p className="flex flex-wrap gap-2 text-small">
                <Chip>{t(`difference.${content.difference}.name`)}</Chip>
                <Chip>
                  {t('words', {
                    confidence: t(`confidence.${content.confidence}`),
                    basis: t(`basis.${content.basis}`),
                  })}
                </Chip>
                <Chip>{sharing(content.sharingLevel, content.sharing)}</Chip>
              </p>
              {actions?.(variant)}
            </Well>
          </li>
        );
      })}
    </ul>
  );
}

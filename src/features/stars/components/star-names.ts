import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import type { MarkerNames } from '#shared/contracts/stars.js';
import { plainWords, readDesignation, superscript } from '../model/star-names.js';
import type { Searchable } from '../model/star-search.js';

export interface StarNaming extends Searchable {
  /** `Aldebaran`, `Gamma² Velorum`, `7 Ceti`, `HR 3055`. */
  title: string;
  /** What stands under it: `Alpha Tauri`, `a group of stars`, `HR 98`. */
  second: string;
}

/** Names of stars in words, and everything by which they can be found. */
export function useStarNaming(): (names: MarkerNames) => StarNaming {
  const { t } = useTranslation('stars');
  return useMemo(
    () => (names) => {
      const group = names.kind === 'star' ? '' : t(names.kind === 'own-figure' ? 'ownFigure' : 'group');
      const read = readDesignation(names.designation);
      const abbreviation = read?.constellation ?? /[A-Z][A-Za-z]{2}$/u.exec(names.designation)?.[0] ?? '';
      // Keys of the texts are the constellations and letters themselves; what is not among them stays as it is.
      const genitive = abbreviation === '' ? '' : t(`genitive.${abbreviation as 'Tau'}`);
      const constellation = abbreviation === '' ? '' : t(`constellation.${abbreviation as 'Tau'}`);
      const letter = read === null || read.letter === '' ? '' : t(`letter.${read.letter as 'α'}`);
      const full =
        read === null
          ? ''
          : letter === ''
            ? t('numberName', { number: read.number, genitive })
            : t('fullName', { letter: `${letter}${superscript(read.index)}`, genitive });
      const hrName = names.hr === null ? '' : t('hr', { hr: names.hr });
      const title = names.name !== '' ? names.name : full !== '' ? full : hrName;
      const under = names.name !== '' && full !== '' ? full : title === hrName ? constellation : hrName;
      return {
        hr: names.hr,
        title,
        second: group === '' ? under : group,
        words: plainWords(
          [
            names.name,
            names.designation,
            full,
            letter + (read?.index ?? ''),
            constellation,
            abbreviation,
            group,
          ].join(' '),
        ),
      };
    },
    [t],
  );
}

import { useEffect, useMemo, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { DEFAULT_LANGUAGE, LANGUAGES } from '#shared/locales/languages.js';
import { columnWordsOf, type ColumnTexts, type ImportColumnWords } from './column-words.js';

/** In the person's own language first; a table may have its titles in any that is there. */
export function useImportColumnWords(): ImportColumnWords {
  const { i18n } = useTranslation(['imports', 'files']);
  const own = i18n.resolvedLanguage ?? DEFAULT_LANGUAGE;
  const isThere = LANGUAGES.every((language) => i18n.hasResourceBundle(language, 'imports'));
  const [isLoaded, setIsLoaded] = useState(isThere);
  useEffect(() => {
    if (isThere) return;
    void i18n.loadLanguages([...LANGUAGES]).then(() => {
      setIsLoaded(true);
    });
  }, [i18n, isThere]);
  return useMemo(() => {
    const order = new Set<string>([own, ...(isLoaded ? LANGUAGES : []), DEFAULT_LANGUAGE]);
    return columnWordsOf(
      [...order].map((language): ColumnTexts => {
        const texts = (namespace: 'imports' | 'files') =>
          i18n.hasResourceBundle(language, namespace)
            ? (i18n.getResourceBundle(language, namespace) as unknown)
            : {};
        return {
          imports: texts('imports') as ColumnTexts['imports'],
          files: texts('files') as ColumnTexts['files'],
        };
      }),
    );
  }, [i18n, own, isLoaded]);
}

import { resources, type Namespace } from '#shared/locales/index.js';
import { DEFAULT_LANGUAGE } from '#shared/locales/languages.js';
import { createInstance } from 'i18next';

/** A text by its key within one namespace, filled in. */
export type Translate = (key: string, values?: Readonly<Record<string, string | number>>) => string;

const i18n = createInstance({
  resources,
  lng: DEFAULT_LANGUAGE,
  fallbackLng: DEFAULT_LANGUAGE,
  // Everything is at hand, so that it is ready with this line and not some moments later.
  initAsync: false,
  // The texts go into files, not into HTML.
  interpolation: { escapeValue: false },
  returnNull: false,
});
void i18n.init();

/** Texts of a namespace in a language, by its tag; what the language lacks is English. */
export function translatorFor(language: string, namespace: Namespace): Translate {
  const fixed = i18n.getFixedT(language, namespace) as (
    key: string,
    values?: Readonly<Record<string, string | number>>,
  ) => string;
  return (key, values) => fixed(key, values);
}

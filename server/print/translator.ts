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

const translators = new Map<string, Translate>();

/** Texts of a namespace in a language, by its tag; what the language lacks is English. */
export function translatorFor(language: string, namespace: Namespace): Translate {
  const name = `${language} ${namespace}`;
  const known = translators.get(name);
  if (known) return known;
  const translate = remembering(i18n.getFixedT(language, namespace) as Translate);
  translators.set(name, translate);
  return translate;
}

/** A table asks for the same few words a thousand times over. */
function remembering(translate: Translate): Translate {
  const words = new Map<string, string>();
  return (key, values) => {
    if (values !== undefined) return translate(key, values);
    const word = words.get(key) ?? translate(key);
    words.set(key, word);
    return word;
  };
}

import i18next, { type BackendModule, type i18n as I18n } from 'i18next';
import { initReactI18next } from 'react-i18next';
import type { en, Namespace } from '#shared/locales/index.js';
import { DEFAULT_LANGUAGE, LANGUAGES } from '#shared/locales/languages.js';
import { texts as common } from '#shared/locales/en/common.js';
import { texts as problems } from '#shared/locales/en/problems.js';

declare module 'i18next' {
  interface CustomTypeOptions {
    defaultNS: 'common';
    resources: typeof en;
  }
}

const RIGHT_TO_LEFT = new Set(['ar', 'fa', 'he', 'ur', 'ps', 'nqo', 'dv']);

/** Every text file of every language as a piece of its own, fetched when a screen first needs it. */
const files = import.meta.glob<{ texts: Record<string, unknown> }>('../../shared/locales/*/*.ts');

const loadTexts: BackendModule = {
  type: 'backend',
  init: () => undefined,
  read: (language, namespace, done) => {
    const load = files[`../../shared/locales/${language}/${namespace}.ts`];
    if (!load) {
      done(null, {});
      return;
    }
    load().then(
      (file) => {
        done(null, file.texts);
      },
      (cause: unknown) => {
        done(cause instanceof Error ? cause : String(cause), false);
      },
    );
  },
};

/** Starts the texts. Only what every screen needs comes with the first load. */
export async function startI18n(language: string = DEFAULT_LANGUAGE): Promise<I18n> {
  await i18next
    .use(loadTexts)
    .use(initReactI18next)
    .init({
      lng: language,
      fallbackLng: DEFAULT_LANGUAGE,
      supportedLngs: [...LANGUAGES],
      ns: ['common', 'problems'],
      defaultNS: 'common',
      partialBundledLanguages: true,
      resources: { en: { common, problems } },
      interpolation: { escapeValue: false }, // React escapes.
      returnNull: false,
    });
  i18next.on('languageChanged', showDirection);
  showDirection(i18next.language);
  return i18next;
}

/** For a route that wants its texts together with its code. */
export async function loadNamespaces(...namespaces: Namespace[]): Promise<void> {
  await i18next.loadNamespaces(namespaces);
}

export function directionOf(language: string): 'ltr' | 'rtl' {
  return RIGHT_TO_LEFT.has(language.split('-')[0] ?? '') ? 'rtl' : 'ltr';
}

function showDirection(language: string): void {
  document.documentElement.lang = language;
  document.documentElement.dir = directionOf(language);
}

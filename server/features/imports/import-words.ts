import { WELL_KNOWN_KEYS, allMarkerKeys, markerNamesOf } from '../stars/marker-names.service.js';
import { plainWords, type ImportWords } from '#shared/calendar/import-dates.js';
import { phrasesOf, type PhraseTree } from '#shared/calendar/import-phrases.js';
import { ENTRY_KINDS, type EntryKind } from '#shared/contracts/calendars.js';
import { OPERATIONS, type Operation } from '#shared/contracts/event-record.js';
import type { VillageWord } from '#shared/contracts/village-word.js';
import type { SkyFigure } from '#shared/contracts/stars.js';
import { resources } from '#shared/locales/index.js';
import { DEFAULT_LANGUAGE, LANGUAGES } from '#shared/locales/languages.js';
import { TABLE_LANGUAGES } from '#shared/locales/table-languages.js';
import { tableTexts } from '#shared/locales/tables.js';
import { PHENOMENA, type Phenomenon } from '#shared/sky/index.js';
import type { KnownWords } from '../word-lists/known-words.service.js';
import { inPlainLetters, namesOf, tableCodes, type CodeWords, type TableCodes } from './code-words.js';

/** Of one language, what its files say by which a table may be written. */
export interface ImportLocale {
  words: {
    months: string;
    phenomena: Readonly<Record<Phenomenon, string>>;
    fixedDate: string;
    days: PhraseTree;
    offsets: PhraseTree;
    figures: Readonly<Partial<Record<string, string>>>;
    phrases: PhraseTree;
    kinds: Readonly<Record<EntryKind, string>>;
    yes: string;
    codes: CodeWords;
  };
  /** Names that the product itself gives, where its screens speak the language. */
  names?: {
    codes: CodeWords;
    kinds: Readonly<Record<EntryKind, string>>;
    phenomena: Readonly<Record<Phenomenon, string>>;
    /** Of signs of the sky. */
    signs: PhraseTree;
  };
}

/** What tables may say, in every language at once: a village's table is in whichever its people write. */
export interface TableWords {
  dates: ImportWords;
  kinds: ReadonlyMap<string, EntryKind>;
  yes: ReadonlySet<string>;
  codes: TableCodes;
  /** Figures that the product knows, by what people call them. */
  figures: ReadonlyMap<string, string>;
}

export function tableWordsOf(locales: readonly ImportLocale[]): TableWords {
  const months = locales.map(({ words }) => words.months.split('|').map(namesOf));
  return {
    dates: {
      months: Array.from({ length: 12 }, (_, month) => months.flatMap((each) => each[month] ?? [])),
      phenomena: byWord(PHENOMENA, (phenomenon) =>
        locales.flatMap(({ words, names }) => [
          ...(names ? [plainWords(names.phenomena[phenomenon])] : []),
          ...namesOf(words.phenomena[phenomenon]),
        ]),
      ),
      fixedDate: locales.flatMap(({ words }) => namesOf(words.fixedDate)),
      days: phrasesOf(...locales.map(({ words }) => inPlainLetters(words.days))),
      offsets: phrasesOf(...locales.map(({ words }) => inPlainLetters(words.offsets))),
      phrases: phrasesOf(
        ...locales.flatMap(({ words, names }) => [names?.signs ?? {}, inPlainLetters(words.phrases)]),
      ),
    },
    kinds: new Map([
      ...ENTRY_KINDS.map((kind) => [kind, kind] as const),
      ...locales.flatMap(({ words, names }) =>
        ENTRY_KINDS.flatMap((kind) =>
          [...(names ? [plainWords(names.kinds[kind])] : []), ...namesOf(words.kinds[kind])].map(
            (name) => [name, kind] as const,
          ),
        ),
      ),
    ]),
    codes: tableCodes(locales.flatMap(({ words, names }) => [names?.codes ?? {}, words.codes])),
    yes: new Set(locales.flatMap(({ words }) => namesOf(words.yes))),
    figures: new Map(
      locales.flatMap(({ words }) =>
        Object.entries(words.figures).flatMap(([key, list]) =>
          namesOf(list ?? '').map((name) => [name, key] as const),
        ),
      ),
    ),
  };
}

/** Of every language in which a table may be written. */
export const TABLE_WORDS = tableWordsOf(
  TABLE_LANGUAGES.map((language): ImportLocale => {
    const { words } = tableTexts[language];
    const ofScreens = LANGUAGES.find((each) => each === language);
    if (ofScreens === undefined) return { words };
    const { calendars, record, sky } = resources[ofScreens];
    return {
      words,
      names: {
        codes: {
          operations: record.operation,
          repeats: record.repeats,
          confidences: record.confidence,
          bases: record.basis,
          signTypes: record.signs.type,
          stillSeen: record.signs.stillSeen,
        },
        kinds: calendars.kind,
        phenomena: sky.phenomenon,
        signs: sky.sign,
      },
    };
  }),
);

/** Who is said to set a day that a table gives without saying so. */
export const DAY_SOURCE = tableTexts[DEFAULT_LANGUAGE].words.source;

/** What a village calls kinds of events, by plain words. */
export type VillageKinds = ReadonlyMap<string, { kind: EntryKind; kindWord: VillageWord }>;

export function villageKinds({ kinds }: KnownWords): VillageKinds {
  return new Map(
    villageWords(kinds, ENTRY_KINDS).map(({ name, code, word }) => [name, { kind: code, kindWord: word }]),
  );
}

/** What a village calls kinds of work, by plain words. */
export type VillageOperations = ReadonlyMap<string, { operation: Operation; operationWord: VillageWord }>;

export function villageOperations({ operations }: KnownWords): VillageOperations {
  return new Map(
    villageWords(operations, OPERATIONS).map(({ name, code, word }) => [
      name,
      { operation: code, operationWord: word },
    ]),
  );
}

function villageWords<C extends string>(
  words: KnownWords['kinds'],
  codes: readonly C[],
): { name: string; code: C; word: VillageWord }[] {
  return [...words.values()].flatMap(({ key, like, word }) => {
    const code = codes.find((each) => each === like);
    if (word === '' || code === undefined) return [];
    return [{ name: plainWords(word), code, word: key === like ? { word } : { id: key, word } }];
  });
}

/** Stars and figures by every name that the village has for them; its own figures come before all others. */
export function markerKeysByName(
  figures: readonly SkyFigure[],
  ownNames: ReadonlyMap<string, string>,
): Map<string, string> {
  const byName = new Map<string, string>();
  const add = (name: string, key: string) => {
    const plain = plainWords(name);
    if (plain !== '' && !byName.has(plain)) byName.set(plain, key);
  };
  for (const [name, key] of ownNames) add(name, key);
  const keys = [...WELL_KNOWN_KEYS, ...allMarkerKeys(figures)];
  for (const key of keys) {
    const { name, designation } = markerNamesOf(key, figures);
    add(name, key);
    // A figure has the letter of the star that leads it; that letter is the star's.
    if (key.startsWith('hr')) add(designation, key);
    add(key, key);
  }
  for (const [name, key] of TABLE_WORDS.figures) add(name, key);
  return byName;
}

function byWord<K extends string, V>(words: readonly K[], valueOf: (word: K) => V): Record<K, V> {
  return Object.fromEntries(words.map((word) => [word, valueOf(word)])) as Record<K, V>;
}

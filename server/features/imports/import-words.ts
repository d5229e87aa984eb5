import { WELL_KNOWN_KEYS, allMarkerKeys, markerNamesOf } from '../stars/marker-names.service.js';
import { plainWords, type ImportWords } from '#shared/calendar/import-dates.js';
import { phrasesOf, type PhraseTree } from '#shared/calendar/import-phrases.js';
import { ENTRY_KINDS, type EntryKind } from '#shared/contracts/calendars.js';
import { OPERATIONS, type Operation } from '#shared/contracts/event-record.js';
import type { VillageWord } from '#shared/contracts/village-word.js';
import type { SkyFigure } from '#shared/contracts/stars.js';
import { resources } from '#shared/locales/index.js';
import { DEFAULT_LANGUAGE, LANGUAGES } from '#shared/locales/languages.js';
import { PHENOMENA, type Phenomenon } from '#shared/sky/index.js';
import type { KnownWords } from '../word-lists/known-words.service.js';
import { namesOf, tableCodes, type CodeWords, type TableCodes } from './code-words.js';

/** Of one language, what its files say by which a table may be written. */
export interface ImportLocale {
  words: {
    months: string;
    phenomena: Readonly<Record<Phenomenon, string>>;
    fixedDate: string;
    figures: Readonly<Record<string, string>>;
    phrases: PhraseTree;
    kinds: Readonly<Record<EntryKind, string>>;
    yes: string;
    codes: CodeWords;
  };
  /** Names that the product itself gives to codes. */
  codeNames: CodeWords;
  kindNames: Readonly<Record<EntryKind, string>>;
  phenomenonNames: Readonly<Record<Phenomenon, string>>;
  /** Names that the product itself gives to signs of the sky. */
  signNames: PhraseTree;
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
        locales.flatMap(({ words, phenomenonNames }) => [
          plainWords(phenomenonNames[phenomenon]),
          ...namesOf(words.phenomena[phenomenon]),
        ]),
      ),
      fixedDate: locales.flatMap(({ words }) => namesOf(words.fixedDate)),
      phrases: phrasesOf(...locales.flatMap(({ words, signNames }) => [signNames, words.phrases])),
    },
    kinds: new Map([
      ...ENTRY_KINDS.map((kind) => [kind, kind] as const),
      ...locales.flatMap(({ words, kindNames }) =>
        ENTRY_KINDS.flatMap((kind) =>
          [plainWords(kindNames[kind]), ...namesOf(words.kinds[kind])].map((name) => [name, kind] as const),
        ),
      ),
    ]),
    codes: tableCodes(locales.flatMap(({ words, codeNames }) => [codeNames, words.codes])),
    yes: new Set(locales.flatMap(({ words }) => namesOf(words.yes))),
    figures: new Map(
      locales.flatMap(({ words }) =>
        Object.entries(words.figures).flatMap(([key, list]) =>
          namesOf(list).map((name) => [name, key] as const),
        ),
      ),
    ),
  };
}

/** Of the languages that are there. */
export const TABLE_WORDS = tableWordsOf(
  LANGUAGES.map((language) => {
    const { imports, calendars, record, sky } = resources[language];
    return {
      words: imports.words,
      codeNames: {
        operations: record.operation,
        repeats: record.repeats,
        confidences: record.confidence,
        bases: record.basis,
        signTypes: record.signs.type,
        stillSeen: record.signs.stillSeen,
      },
      kindNames: calendars.kind,
      phenomenonNames: sky.phenomenon,
      signNames: sky.sign,
    };
  }),
);

/** Who is said to set a day that a table gives without saying so. */
export const DAY_SOURCE = resources[DEFAULT_LANGUAGE].imports.words.source;

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

import { WELL_KNOWN_KEYS, allMarkerKeys, markerNamesOf } from '../stars/marker-names.service.js';
import { plainWords, type ImportWords } from '#shared/calendar/import-dates.js';
import { ENTRY_KINDS, type EntryKind } from '#shared/contracts/calendars.js';
import type { VillageWord } from '#shared/contracts/village-word.js';
import type { SkyFigure } from '#shared/contracts/stars.js';
import { texts as calendarTexts } from '#shared/locales/en/calendars.js';
import { texts } from '#shared/locales/en/imports.js';
import type { KnownWords } from '../word-lists/known-words.service.js';

const { words } = texts;

/** What tables in the language of the office may say. English is the one there is. */
export const IMPORT_WORDS: ImportWords = {
  months: words.months.split('|').map(namesOf),
  phenomena: {
    'heliacal-rising': namesOf(words.phenomena['heliacal-rising']),
    'cosmical-setting': namesOf(words.phenomena['cosmical-setting']),
    'acronychal-rising': namesOf(words.phenomena['acronychal-rising']),
    'heliacal-setting': namesOf(words.phenomena['heliacal-setting']),
  },
  fixedDate: namesOf(words.fixedDate),
};

export const DAY_SOURCE = words.source;
export const SEASONS: ReadonlyMap<string, string> = keyByName(words.seasons);
export const YES: ReadonlySet<string> = new Set(namesOf(words.yes));

const KINDS: ReadonlyMap<string, string> = new Map([
  ...Object.entries(calendarTexts.kind).map(([kind, name]) => [plainWords(name), kind] as const),
  ...keyByName(words.kinds),
]);

/** What a village calls kinds of events, by plain words. */
export type VillageKinds = ReadonlyMap<string, { kind: EntryKind; kindWord: VillageWord }>;

export function villageKinds({ kinds }: KnownWords): VillageKinds {
  return new Map(
    [...kinds.values()].flatMap(({ key, like, word }) => {
      if (word === '' || !isKind(like)) return [];
      const kindWord = key === like ? { word } : { id: key, word };
      return [[plainWords(word), { kind: like, kindWord }] as const];
    }),
  );
}

/** The village's own words come before all others. */
export function kindOf(
  text: string,
  village: VillageKinds,
): { kind: EntryKind | null; kindWord?: VillageWord } {
  const plain = plainWords(text);
  const own = village.get(plain);
  if (own) return own;
  const kind = KINDS.get(plain) ?? plain;
  return { kind: isKind(kind) ? kind : null };
}

function isKind(code: string | null): code is EntryKind {
  return ENTRY_KINDS.some((kind) => kind === code);
}

/** Stars and figures by every name that the village has for them; its own figures come before all others. */
export function markerKeysByName(figures: readonly SkyFigure[]): Map<string, string> {
  const byName = new Map<string, string>();
  const add = (name: string, key: string) => {
    const plain = plainWords(name);
    if (plain !== '' && !byName.has(plain)) byName.set(plain, key);
  };
  for (const { key, name } of figures) add(name, key);
  const builtIn = keyByName(words.figures);
  const keys = [...WELL_KNOWN_KEYS, ...allMarkerKeys(figures)];
  for (const key of keys) {
    const { name, designation } = markerNamesOf(key, figures);
    add(name, key);
    // A figure has the letter of the star that leads it; that letter is the star's.
    if (key.startsWith('hr')) add(designation, key);
    add(key, key);
  }
  for (const [name, key] of builtIn) add(name, key);
  return byName;
}

function keyByName(names: Readonly<Record<string, string>>): Map<string, string> {
  return new Map(
    Object.entries(names).flatMap(([key, list]) =>
      namesOf(list).map((name) => [plainWords(name), key] as const),
    ),
  );
}

function namesOf(list: string): string[] {
  return list.split(',').map((name) => plainWords(name));
}

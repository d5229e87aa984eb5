import type { Notice } from '#shared/contracts/weather.js';
import type { SheetQuery } from '#shared/contracts/sheets.js';
import type { VersionEntryBody, VersionHeader, VersionState } from '#shared/contracts/versions.js';
import { DEFAULT_LANGUAGE, LANGUAGES } from '#shared/locales/languages.js';
import type { SheetModel, SheetMoon, SheetNotice } from '#shared/sheet/sheet-model.js';
import { dayNumberOf, isoDateOf } from '#shared/kernel/iso-date.js';
import { civilDayOf, moonPhases, moonsBetween } from '#shared/sky/index.js';
import { sheetWords } from '../../print/sheet-words.js';
import { translatorFor, type Translate } from '../../print/translator.js';
import { settingsOf, siteOf } from '../places/watched-place.service.js';
import { toSheetChanges, type SheetBefore } from './sheet-changes.mapper.js';
import { toSheetEntries } from './sheet-entries.mapper.js';
import { toSheetMarkers } from './sheet-markers.mapper.js';

/** No month from crescent to crescent is longer. */
const LONGEST_MONTH_DAYS = 32;

export interface SheetFacts {
  header: VersionHeader;
  /** Those that may be printed. */
  entries: readonly VersionEntryBody[];
  /** Null for the draft. */
  state: VersionState | null;
  label: string | null;
  /** As they signed; empty for what nobody has signed. */
  signerNames: readonly string[];
  /** Civil day at the place, `YYYY-MM-DD`. */
  printDate: string;
  /** Of the weather service, as they hold on that day. */
  notices?: readonly Notice[];
  /** The board that this one replaces in the same year. */
  before?: SheetBefore | undefined;
}

/** A version, or the draft, as everything that its printed board says. */
export function toSheetModel(facts: SheetFacts, { layout, paper }: SheetQuery): SheetModel {
  const { header, state, label } = facts;
  const { place, year } = header;
  const language = printLanguage(header.officerLanguage.tag);
  const files = translatorFor(language, 'files');
  const print = translatorFor(language, 'print');
  const sky = translatorFor(language, 'sky');
  const words = sheetWords({ translate: print, language, year });
  const changes = facts.before && toSheetChanges(facts.before, facts.entries, { files, words });
  return {
    layout,
    paper,
    year,
    communityName: header.communityName,
    placeName: place.name,
    latitudeDeg: place.latitudeDeg,
    label,
    stateWatermark: state === 'published' ? null : print(`state.${state ?? 'draft'}`),
    officerLanguage: language,
    villageLanguage: header.villageLanguage.tag,
    markers: toSheetMarkers(facts.entries, header.markers, year, { files, sky }),
    entries: toSheetEntries(facts.entries, year, { files, sky, words }),
    moon: moonOf(header),
    moonBegins: moonBeginsOf(header),
    contacts: { weather: header.weatherContact, agriculture: header.agricultureContact },
    basis: [basisOf(header, files)],
    ...(changes && { changes }),
    ...(facts.notices && { notices: facts.notices.map(toSheetNotice) }),
    signedBy: listOf(facts.signerNames, language),
    printDate: facts.printDate,
    words,
  };
}

function toSheetNotice({ text, issuer, issuedOn, expiresOn }: Notice): SheetNotice {
  return { text: text.replaceAll(/\s+/gu, ' '), issuer, issued: issuedOn, expires: expiresOn };
}

/** The fixed words are printed in the officer's language where we have its texts, months and all, else in English. */
function printLanguage(tag: string): string {
  const base = tag.split('-')[0]?.toLowerCase();
  return LANGUAGES.some((language) => language === base) ? tag : DEFAULT_LANGUAGE;
}

/** Phases on the days that the village's clock gives them. */
function moonOf({ place, year }: VersionHeader): SheetMoon[] {
  return moonPhases(year).flatMap(({ quarter, jdUt }) => {
    const { gregorian } = civilDayOf(jdUt, place.timeZone, place.longitudeDeg);
    if (gregorian.year !== year) return [];
    const date = [gregorian.year, gregorian.month, gregorian.day].map((part) =>
      String(part).padStart(2, '0'),
    );
    return [{ phase: quarter, date: date.join('-') }];
  });
}

/** Evenings of first crescents, from the one before the year on; where none is seen, the new Moon begins the count. */
function moonBeginsOf({ place, year }: VersionHeader): string[] {
  const [from, to] = [dayNumberOf(year, 1, 1) - LONGEST_MONTH_DAYS, dayNumberOf(year, 12, 31)];
  return moonsBetween(siteOf(place), settingsOf(place), from, to)
    .map(({ newMoon, firstCrescent }) => isoDateOf((firstCrescent.expected ?? newMoon).dayNumber))
    .toSorted();
}

function basisOf({ place, engineVersion }: VersionHeader, t: Translate): string {
  return t('sheet.basis', {
    rule: t(`sheet.rule.${place.thresholdSet}`),
    skyline: t(`sheet.skyline.${place.skyline.length === 0 ? 'flat' : 'hills'}`),
    engineVersion,
  });
}

function listOf(names: readonly string[], language: string): string {
  return new Intl.ListFormat(language, { type: 'conjunction' }).format([...new Set(names)]);
}

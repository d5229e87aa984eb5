import { boardOf } from '#shared/calendar/variants.js';
import { isStarLead } from '#shared/calendar/entry-model.js';
import { skySign } from '#shared/calendar/sky-sign.js';
import type { EntryInput } from '#shared/contracts/calendars.js';
import type { FrozenMarker, VersionEntryBody } from '#shared/contracts/versions.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { icalDate, icalInstant, icalText, icalWords, type IcalLine } from '#shared/kernel/ical-text.js';
import { addDays } from '#shared/kernel/iso-date.js';
import { DEFAULT_LANGUAGE } from '#shared/locales/languages.js';
import type { SheetWords } from '#shared/sheet/sheet-words.js';
import { compassPoint } from '#shared/sky/index.js';
import { sheetWords } from '../../print/sheet-words.js';
import { translatorFor, type Translate } from '../../print/translator.js';
import { createHash } from 'node:crypto';
import type { CalendarContent } from '../versions/frozen-content.service.js';

interface Texts {
  files: Translate;
  sky: Translate;
  kinds: Translate;
  words: SheetWords;
}

interface Event {
  uid: string;
  title: string;
  from: string;
  /** The last day that belongs to it. */
  to: string;
  sentences: string[];
  category: string;
}

/**
 * A calendar as RFC 5545: a span of whole days for each entry with a window, a day for each marker with its range in
 * words, cautions beside each. The same thing keeps its UID; a later version has the higher SEQUENCE.
 * @param alarmDays how many days ahead a telephone reminds; null for never
 */
export function calendarIcs(content: CalendarContent, alarmDays: number | null): string {
  const { header, state, label } = content;
  const { files } = textsFor(header.year);
  const issue = label ?? files(`ics.state.${state ?? 'draft'}`);
  const about = { community: header.communityName, place: header.place.name, year: header.year, issue };
  const words = { name: files('ics.name', about), about: files('ics.about', about) };
  return wholeFile(words, eventLines(content, alarmDays));
}

/** Several calendars of one village in one file, for a telephone that fetches it again and again. */
export function calendarsIcs(contents: readonly CalendarContent[]): string {
  const { files } = textsFor(contents[0]?.header.year ?? 0);
  const about = { community: contents[0]?.header.communityName ?? '' };
  const words = { name: files('ics.feedName', about), about: files('ics.feedAbout', about) };
  return wholeFile(
    words,
    contents.flatMap((content) => eventLines(content, null)),
  );
}

function wholeFile(words: { name: string; about: string }, events: readonly IcalLine[]): string {
  const caution = translatorFor(DEFAULT_LANGUAGE, 'files')('caution');
  return icalText([
    ['BEGIN', 'VCALENDAR'],
    ['VERSION', '2.0'],
    ['PRODID', '-//Dawnpeg//Village calendar//EN'],
    ['CALSCALE', 'GREGORIAN'],
    ['METHOD', 'PUBLISH'],
    ['X-WR-CALNAME', icalWords(words.name)],
    ['X-WR-CALDESC', icalWords([words.about, caution].join(' '))],
    ...events,
    ['END', 'VCALENDAR'],
  ]);
}

function eventLines({ header, entries, state }: CalendarContent, alarmDays: number | null): IcalLine[] {
  const texts = textsFor(header.year);
  const frame = {
    stamp: icalInstant(header.submittedAt),
    sequence: String(header.number),
    status: state === 'published' ? 'CONFIRMED' : 'TENTATIVE',
    alarmDays,
  };
  return [
    ...entries.flatMap((entry) => eventOfEntry(entry, header.calendarId, texts)),
    ...eventsOfMarkers(entries, header.markers, header.calendarId, texts),
  ]
    .sort((a, b) => (a.from === b.from ? compare(a.uid, b.uid) : compare(a.from, b.from)))
    .flatMap((event) => linesOf(event, frame));
}

function textsFor(year: number): Texts {
  const language = DEFAULT_LANGUAGE;
  const translate = translatorFor(language, 'print');
  return {
    files: translatorFor(language, 'files'),
    sky: translatorFor(language, 'sky'),
    kinds: translatorFor(language, 'calendars'),
    words: sheetWords({ translate, language, year }),
  };
}

interface Frame {
  stamp: string;
  sequence: string;
  status: string;
  alarmDays: number | null;
}

function linesOf(event: Event, { stamp, sequence, status, alarmDays }: Frame): IcalLine[] {
  const alarm: IcalLine[] =
    alarmDays === null
      ? []
      : [
          ['BEGIN', 'VALARM'],
          ['ACTION', 'DISPLAY'],
          ['DESCRIPTION', icalWords(event.title)],
          ['TRIGGER', `-P${String(alarmDays)}D`],
          ['END', 'VALARM'],
        ];
  return [
    ['BEGIN', 'VEVENT'],
    ['UID', event.uid],
    ['DTSTAMP', stamp],
    ['SEQUENCE', sequence],
    ['STATUS', status],
    ['TRANSP', 'TRANSPARENT'],
    ['DTSTART;VALUE=DATE', icalDate(event.from)],
    // The first day that no longer belongs to it.
    ['DTEND;VALUE=DATE', icalDate(addDays(event.to, 1))],
    ['SUMMARY', icalWords(event.title)],
    ['DESCRIPTION', icalWords(event.sentences.join('\n'))],
    ['CATEGORIES', icalWords(event.category)],
    ...alarm,
    ['END', 'VEVENT'],
  ];
}

function eventOfEntry(entry: VersionEntryBody, calendarId: string, texts: Texts): Event[] {
  const { content, entryId } = entry;
  const { window, beside } = boardOf(entry);
  // What is nothing but a marker stands among the markers.
  if (window === null || isOnlyMarker(content)) return [];
  const { words, files, kinds } = texts;
  const { otherSigns, ifLate, caution, lastDate } = content;
  return [
    {
      uid: `${entryId}@${calendarId}.dawnpeg`,
      title: titleOf(content),
      from: window.bestFrom,
      to: window.bestTo,
      category: kindIn(content, kinds),
      sentences: [
        content.protectiveWatch
          ? words.watchFromTo({ from: window.bestFrom, to: window.bestTo })
          : words.bestFromTo({ from: window.bestFrom, to: window.bestTo }),
        files('ics.early', { date: words.day(window.earliest) }),
        words.lastAdvised({
          date: window.lastAdvised,
          source: window.lastAdvisedBy === 'fixed' ? (lastDate?.source ?? '') : '',
        }),
        // Other keepers' timings stand beside it, as on the board; none is averaged.
        ...beside
          .filter(({ variantId }) => variantId !== null)
          .map(({ window: { bestFrom: from, bestTo: to } }) =>
            files('ics.beside', { days: words.bestFromTo({ from, to }) }),
          ),
        ...(otherSigns === '' ? [] : [words.lookFor({ signs: otherSigns, needed: null })]),
        ...(ifLate === '' ? [] : [words.ifLate(ifLate)]),
        ...(caution === '' ? [] : [words.takeCare(caution)]),
        words.shortCaution(),
      ],
    },
  ];
}

function kindIn({ kind, kindWord }: EntryInput, kinds: Translate): string {
  return kindWord?.word ?? kinds(`kind.${kind}`);
}

function isOnlyMarker({ kind, lead }: EntryInput): boolean {
  return kind === 'marker-only' && (isStarLead(lead) || lead.type === 'sky');
}

/** Every day that some entry goes by, once. A day that people saw stands in the entry's own span. */
function eventsOfMarkers(
  entries: readonly VersionEntryBody[],
  frozen: readonly FrozenMarker[],
  calendarId: string,
  { files, sky, words, kinds }: Texts,
): Event[] {
  const names = new Map(frozen.map((marker) => [marker.markerKey, nameOf(marker)]));
  const found = new Map<string, Event>();
  for (const { content, dates } of entries) {
    const { lead } = content;
    if (dates.marker === null || (lead.type !== 'sky' && !isStarLead(lead))) continue;
    const { expected, early, late } = dates.marker;
    const key =
      lead.type === 'sky'
        ? canonicalJson(lead)
        : [lead.markerKey, lead.phenomenon, String(lead.occurrence)].join(' ');
    const starKey =
      lead.type === 'sky' ? ('markerKey' in lead.spec ? lead.spec.markerKey : '') : lead.markerKey;
    const name = names.get(starKey) ?? starKey;
    const sign =
      lead.type === 'sky'
        ? skySign(lead.spec, name, { t: sky, compassPoint })
        : files('sheet.shows', { name, phenomenon: sky(`phenomenon.${lead.phenomenon}`) });
    const isTold = content.kind === 'marker-only';
    const told = isTold ? titleOf(content) : null;
    const date = expected.gregorian;
    if (found.has(key) && told === null) continue;
    found.set(key, {
      uid: `sign-${shortHash(key)}@${calendarId}.dawnpeg`,
      title: told ?? sign,
      from: date,
      to: date,
      category: isTold ? kindIn(content, kinds) : kinds('kind.marker-only'),
      sentences: [
        words.markerSentence({
          phenomenon: sign,
          date,
          from: early?.gregorian ?? date,
          to: late?.gregorian ?? date,
        }),
        ...(told !== null && content.caution !== '' ? [words.takeCare(content.caution)] : []),
        words.eyesCaution(),
        words.shortCaution(),
      ],
    });
  }
  return [...found.values()];
}

function titleOf({ titleVillage, titleOfficer }: EntryInput): string {
  return titleVillage === '' || titleVillage === titleOfficer
    ? titleOfficer
    : `${titleVillage} · ${titleOfficer}`;
}

function nameOf({ name, designation }: FrozenMarker): string {
  return name === '' ? designation : name;
}

function shortHash(key: string): string {
  return createHash('sha256').update(key, 'utf8').digest('hex').slice(0, 20);
}

function compare(a: string, b: string): number {
  return a < b ? -1 : a > b ? 1 : 0;
}

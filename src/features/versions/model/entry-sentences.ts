import type { ParseKeys } from 'i18next';
import { isStarLead } from '#shared/calendar/entry-model.js';
import type { EntryDates, EntryInput, EntryLead, FixedLastDate } from '#shared/contracts/calendars.js';
import type { OccurrenceDays } from '#shared/contracts/stars.js';
import type { EntryComparison, VersionEntryBody } from '#shared/contracts/versions.js';
import type { ChangeTopic } from './change-topics.js';
import { daysBetween } from '#shared/kernel/iso-date.js';
import { sameJson } from '#shared/kernel/canonical-json.js';

/** One whole sentence: the key of its text, and what stands in it. */
export interface Sentence {
  key: ParseKeys<'versions'>;
  values: Record<string, string | number>;
  /** Stands in the same paragraph as the sentence before it. */
  goesOn?: boolean;
}

/** Sentences by paragraph. */
export function paragraphs(sentences: readonly Sentence[]): Sentence[][] {
  const found: Sentence[][] = [];
  for (const sentence of sentences) {
    const last = found.at(-1);
    if (sentence.goesOn === true && last) last.push(sentence);
    else found.push([sentence]);
  }
  return found;
}

const TEXT_SENTENCES = [
  'title',
  'titleVillage',
  'crop',
  'otherSigns',
  'ifLate',
  'caution',
  'notes',
  'kind',
  'icon',
];
const SENTENCES_OF: Readonly<Record<Exclude<ChangeTopic, 'dates'>, readonly string[]>> = {
  text: [...TEXT_SENTENCES, 'record'],
  levels: ['level', 'agreedNew', 'agreedGone'],
  people: ['giver', 'record'],
};
const ABOUT_ALL = ['added', 'addedUndated', 'removed', 'removedUndated'];

/** Only sentences about one topic; without one, all of them. */
export function sentencesAbout(sentences: readonly Sentence[], topic: ChangeTopic | null): Sentence[] {
  const others = Object.values(SENTENCES_OF).flat();
  const isAbout = ({ key }: Sentence) => {
    const [, name = ''] = key.split('.');
    if (topic === null || ABOUT_ALL.includes(name)) return true;
    if (topic !== 'dates') return SENTENCES_OF[topic].includes(name);
    return name !== 'noDateMoves' && !others.includes(name);
  };
  return sentences.filter(isAbout);
}

/** How single things are said; sentences are built around them. */
export interface CompareWords {
  day: (iso: string) => string;
  window: (body: VersionEntryBody) => string;
  about: (days: OccurrenceDays) => string;
  lead: (lead: EntryLead) => string;
  /** The star or sign alone, without its phenomenon. */
  signName: (lead: Extract<EntryLead, { type: 'marker' | 'marker-as-seen' | 'sky' }>) => string;
  lastDate: (lastDate: FixedLastDate) => string;
  kind: (content: Pick<EntryInput, 'kind' | 'kindWord'>) => string;
  icon: (icon: EntryInput['icon']) => string;
  level: (level: EntryInput['sharingLevel']) => string;
}

/** What changed in one entry, the most important first. Empty where nothing did. */
export function entrySentences(entry: EntryComparison, year: number, words: CompareWords): Sentence[] {
  const { before, after } = entry;
  if (before && after) return changeSentences(before, after, words);
  if (after) {
    return after.dates.window
      ? [{ key: 'sentence.added', values: { window: words.window(after) } }]
      : [{ key: 'sentence.addedUndated', values: { year } }];
  }
  if (before) {
    return before.dates.window
      ? [{ key: 'sentence.removed', values: { window: words.window(before) } }]
      : [{ key: 'sentence.removedUndated', values: {} }];
  }
  return [];
}

function changeSentences(before: VersionEntryBody, after: VersionEntryBody, words: CompareWords): Sentence[] {
  const days = [
    ...windowSentences(before, after, words),
    ...leadSentences(before, after, words),
    ...countedSentences(before.dates, after.dates, words),
    ...lastDateSentences(before.content, after.content, words),
  ];
  const other = wordSentences(before.content, after.content, words);
  if (days.length === 0 && other.length > 0)
    other.push({ key: 'sentence.noDateMoves', values: {}, goesOn: true });
  if (days.length + other.length > 0) return [...days, ...other];
  if (!sameJson(before.content, after.content)) return [{ key: 'sentence.offsetsOnly', values: {} }];
  return sameJson(before.dates, after.dates) ? [] : [{ key: 'sentence.warnings', values: {} }];
}

const POINTS = ['earliest', 'bestFrom', 'bestTo', 'lastAdvised'] as const;

function windowSentences(before: VersionEntryBody, after: VersionEntryBody, words: CompareWords): Sentence[] {
  const was = before.dates.window;
  const is = after.dates.window;
  if (was === null && is === null) return [];
  if (is === null) return [{ key: 'sentence.windowGone', values: { before: words.window(before) } }];
  if (was === null) return [{ key: 'sentence.windowCame', values: { after: words.window(after) } }];
  const moves = POINTS.map((point) => ({ point, days: daysBetween(was[point], is[point]) }));
  const moving = moves.filter(({ days }) => days !== 0);
  const [first] = moving;
  if (!first) return [];
  if (moving.length === POINTS.length && moving.every(({ days }) => days === first.days)) {
    return [
      {
        key: `sentence.allMove.${direction(first.days)}`,
        values: { count: Math.abs(first.days), window: words.window(after) },
      },
    ];
  }
  const each = moving.map(({ point, days }, index): Sentence => ({
    key: `sentence.${point}.${direction(days)}`,
    values: { count: Math.abs(days), before: words.day(was[point]), after: words.day(is[point]) },
    goesOn: index > 0,
  }));
  const rest: Sentence = { key: 'sentence.otherDaysStay', values: {}, goesOn: true };
  return moving.length < POINTS.length ? [...each, rest] : each;
}

/** The other counting of what is counted from something else, such as its plan while it waits for the day of other work. */
function countedSentences(before: EntryDates, after: EntryDates, words: CompareWords): Sentence[] {
  const was = before.counted?.beside?.bestFrom;
  const is = after.counted?.beside?.bestFrom;
  if (was === undefined || is === undefined || was === is) return [];
  const values = { before: words.day(was), after: words.day(is) };
  const days = daysBetween(was, is);
  return before.counted?.basis === 'waiting' && after.counted?.basis === 'waiting'
    ? [{ key: `sentence.planMoves.${direction(days)}`, values: { ...values, count: Math.abs(days) } }]
    : [{ key: 'sentence.otherCounting', values }];
}

/** Another lead; or the same, whose day the sky (or the place) moved. */
function leadSentences(before: VersionEntryBody, after: VersionEntryBody, words: CompareWords): Sentence[] {
  const was = before.content.lead;
  const is = after.content.lead;
  if (!sameJson(was, is)) {
    return [{ key: 'sentence.lead', values: { before: words.lead(was), after: words.lead(is) } }];
  }
  const wasDays = before.dates.marker;
  const isDays = after.dates.marker;
  if ((is.type !== 'sky' && !isStarLead(is)) || !wasDays || !isDays || sameJson(wasDays, isDays)) return [];
  const days = isDays.expected.dayNumber - wasDays.expected.dayNumber;
  const marker = words.signName(is);
  if (days === 0) {
    return [
      {
        key: 'sentence.rangeMoved',
        values: { marker, before: words.about(wasDays), after: words.about(isDays) },
      },
    ];
  }
  return [
    {
      key: `sentence.markerMoved.${direction(days)}`,
      values: {
        marker,
        count: Math.abs(days),
        before: words.day(wasDays.expected.gregorian),
        after: words.day(isDays.expected.gregorian),
      },
    },
  ];
}

function lastDateSentences(before: EntryInput, after: EntryInput, words: CompareWords): Sentence[] {
  const sentences: Sentence[] = [];
  const was = before.lastDate;
  const is = after.lastDate;
  if (!was && is) sentences.push({ key: 'sentence.lastDateNew', values: { after: words.lastDate(is) } });
  if (was && !is) sentences.push({ key: 'sentence.lastDateGone', values: { before: words.lastDate(was) } });
  if (was && is && !sameJson(was, is)) {
    sentences.push({
      key: 'sentence.lastDateChanged',
      values: { before: words.lastDate(was), after: words.lastDate(is) },
    });
  }
  if (before.protectiveWatch !== after.protectiveWatch) {
    sentences.push({ key: after.protectiveWatch ? 'sentence.watchNew' : 'sentence.watchGone', values: {} });
  }
  return sentences;
}

const TEXTS = ['titleVillage', 'crop', 'otherSigns', 'ifLate', 'caution', 'notes', 'giver'] as const;

function wordSentences(before: EntryInput, after: EntryInput, words: CompareWords): Sentence[] {
  const sentences: Sentence[] = [];
  const tell = (key: Sentence['key'], was: string, is: string) => {
    if (was !== is) sentences.push({ key, values: { before: was, after: is } });
  };
  tell('sentence.title', before.titleOfficer, after.titleOfficer);
  for (const field of TEXTS) {
    const change = before[field] === '' ? 'added' : after[field] === '' ? 'removed' : 'changed';
    tell(`sentence.${field}.${change}`, before[field], after[field]);
  }
  tell('sentence.kind', words.kind(before), words.kind(after));
  tell('sentence.icon', words.icon(before.icon), words.icon(after.icon));
  tell('sentence.level', words.level(before.sharingLevel), words.level(after.sharingLevel));
  if (!sameJson(before.record ?? null, after.record ?? null)) {
    const change = before.record === undefined ? 'added' : after.record === undefined ? 'removed' : 'changed';
    sentences.push({ key: `sentence.record.${change}`, values: {} });
  }
  if (before.agreedToPrint !== after.agreedToPrint) {
    sentences.push({ key: after.agreedToPrint ? 'sentence.agreedNew' : 'sentence.agreedGone', values: {} });
  }
  return sentences;
}

function direction(days: number): 'later' | 'earlier' {
  return days > 0 ? 'later' : 'earlier';
}

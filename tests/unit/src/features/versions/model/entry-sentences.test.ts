import { describe, expect, it } from 'vitest';
import type { EntryDates, EntryInput } from '#shared/contracts/calendars.js';
import type { EntryComparison, VersionEntryBody } from '#shared/contracts/versions.js';
import { compareEntries } from '#shared/calendar/comparison.js';
import { addDays, dayNumberFromIso } from '#shared/kernel/iso-date.js';
import {
  entrySentences,
  paragraphs,
  type CompareWords,
} from '#src/features/versions/model/entry-sentences.js';
import { content } from '#tests/support/draft-of-tazimel.js';

/** Words that show what was asked for. */
const words: CompareWords = {
  day: (iso) => iso.slice(5),
  window: ({ dates }) => `window ${dates.window?.bestFrom.slice(5) ?? 'none'}`,
  about: ({ expected }) => `about ${expected.gregorian.slice(5)}`,
  lead: (lead) => (lead.type === 'marker' ? lead.markerKey : 'fixed date'),
  signName: (lead) => `<${lead.type === 'sky' ? lead.spec.kind : lead.markerKey}>`,
  lastDate: ({ date, source }) => `${date.day}/${date.month} ${source}`,
  kind: ({ kind, kindWord }) => kindWord?.word ?? kind,
  icon: (icon) => icon,
  level: (level) => level,
};

const civil = (iso: string) => ({ dayNumber: dayNumberFromIso(iso), gregorian: iso, julian: iso });

interface Facts {
  sign?: string;
  late?: string;
  window?: [string, string, string, string] | null;
}

function dates({ sign = '2027-06-07', late = '2027-06-11', window }: Facts = {}): EntryDates {
  const [earliest, bestFrom, bestTo, lastAdvised] = window ?? [
    '2027-06-10',
    '2027-06-14',
    '2027-06-30',
    '2027-07-05',
  ];
  return {
    starOutcome: 'rises-and-sets',
    phenomenonOutcome: 'dated',
    marker: { expected: civil(sign), early: null, late: civil(late), notes: [] },
    window: window === null ? null : { earliest, bestFrom, bestTo, lastAdvised, lastAdvisedBy: 'offset' },
    warnings: [],
  };
}

const body = (changes: Partial<EntryInput> = {}, facts: Facts = {}): VersionEntryBody => ({
  entryId: 'e1',
  content: content(changes),
  dates: dates(facts),
});

function compared(before: VersionEntryBody | null, after: VersionEntryBody | null): EntryComparison {
  const [entry] = compareEntries(before ? [before] : [], after ? [after] : []);
  if (!entry) throw new Error('Nothing to compare');
  return { titleOfficer: 'Sow long millet', titleVillage: '', ...entry };
}

const say = (before: VersionEntryBody | null, after: VersionEntryBody | null) =>
  entrySentences(compared(before, after), 2027, words).map(({ key, values }) => [key, values]);

describe('what changed in an entry', () => {
  it('is nothing where nothing did', () => {
    expect(say(body(), body())).toEqual([]);
  });

  it('says how the plan moves of what waits for other work, and never only that something did', () => {
    const waiting = (bestFrom: string, basis: 'waiting' | 'seen' = 'waiting') => ({
      ...body({}, { window: null }),
      dates: {
        ...dates({ window: null }),
        counted: {
          ...{ basis, from: null, to: null },
          beside: {
            ...{ earliest: '2027-06-30', bestFrom, bestTo: '2027-07-10', lastAdvised: '2027-07-20' },
            lastAdvisedBy: 'offset' as const,
          },
        },
      },
    });
    expect(say(waiting('2027-07-03'), waiting('2027-07-06'))).toEqual([
      ['sentence.planMoves.later', { count: 3, before: '07-03', after: '07-06' }],
    ]);
    expect(say(waiting('2027-07-03'), waiting('2027-07-03'))).toEqual([]);
    expect(say(waiting('2027-07-03', 'seen'), waiting('2027-07-02', 'seen'))).toEqual([
      ['sentence.otherCounting', { before: '07-03', after: '07-02' }],
    ]);
  });

  it('names the day that moves, by how much and from where to where, and that the others stay', () => {
    const later = body({}, { window: ['2027-06-10', '2027-06-17', '2027-06-30', '2027-07-05'] });
    expect(say(body(), later)).toEqual([
      ['sentence.bestFrom.later', { count: 3, before: '06-14', after: '06-17' }],
      ['sentence.otherDaysStay', {}],
    ]);
    expect(say(later, body())[0]).toEqual([
      'sentence.bestFrom.earlier',
      { count: 3, before: '06-17', after: '06-14' },
    ]);
  });

  it('says once that all days move, and that the star is the reason', () => {
    const day = (iso: string) => addDays(iso, -1);
    const earlier = body(
      {},
      {
        sign: '2027-06-06',
        window: [day('2027-06-10'), day('2027-06-14'), day('2027-06-30'), day('2027-07-05')],
      },
    );
    expect(say(body(), earlier)).toEqual([
      ['sentence.allMove.earlier', { count: 1, window: 'window 06-13' }],
      ['sentence.markerMoved.earlier', { marker: '<pleiades>', count: 1, before: '06-07', after: '06-06' }],
    ]);
  });

  it('says that only the range changed where the sign keeps its day', () => {
    expect(say(body(), body({}, { late: '2027-06-12' }))).toEqual([
      ['sentence.rangeMoved', { marker: '<pleiades>', before: 'about 06-07', after: 'about 06-07' }],
    ]);
  });

  it('says when it loses its days or gets some', () => {
    expect(say(body(), body({}, { window: null }))[0]).toEqual([
      'sentence.windowGone',
      { before: 'window 06-14' },
    ]);
    expect(say(body({}, { window: null }), body())[0]).toEqual([
      'sentence.windowCame',
      { after: 'window 06-14' },
    ]);
  });

  it('says what leads now, what ended the window, and what is watched', () => {
    const fixed = { type: 'fixed-date' as const, date: { month: 7, day: 5 }, source: 'office' };
    const lastDate = { date: { month: 7, day: 5 }, source: 'office' };
    expect(say(body(), body({ lead: fixed }))).toEqual([
      ['sentence.lead', { before: 'pleiades', after: 'fixed date' }],
    ]);
    expect(say(body(), body({ hasLastDate: true, lastDate }))).toEqual([
      ['sentence.lastDateNew', { after: '5/7 office' }],
    ]);
    expect(say(body({ protectiveWatch: true }), body())).toEqual([['sentence.watchGone', {}]]);
  });

  it('tells words that came, changed and went, and that no day moves', () => {
    const before = body({ otherSigns: 'wet soil', notes: 'old', caution: '' });
    const after = body({ otherSigns: '', notes: 'new', caution: 'mind snakes' });
    expect(say(before, after)).toEqual([
      ['sentence.otherSigns.removed', { before: 'wet soil', after: '' }],
      ['sentence.caution.added', { before: '', after: 'mind snakes' }],
      ['sentence.notes.changed', { before: 'old', after: 'new' }],
      ['sentence.noDateMoves', {}],
    ]);
  });

  it('does not hide that days were counted otherwise although the dates came out the same', () => {
    const offsets = { earliestDays: 3, bestFromDays: 7, bestToDays: 23, lastAdvisedDays: 29 };
    expect(say(body(), body({ offsets }))).toEqual([['sentence.offsetsOnly', {}]]);
  });

  it('tells new entries and those taken out with their days', () => {
    expect(say(null, body())).toEqual([['sentence.added', { window: 'window 06-14' }]]);
    expect(say(null, body({}, { window: null }))).toEqual([['sentence.addedUndated', { year: 2027 }]]);
    expect(say(body(), null)).toEqual([['sentence.removed', { window: 'window 06-14' }]]);
  });
});

describe('paragraphs', () => {
  it('hold together what goes on from the sentence before', () => {
    const later = body({ notes: 'x' }, { window: ['2027-06-11', '2027-06-17', '2027-06-30', '2027-07-05'] });
    const keys = paragraphs(entrySentences(compared(body(), later), 2027, words)).map((each) =>
      each.map(({ key }) => key),
    );
    expect(keys).toEqual([
      ['sentence.earliest.later', 'sentence.bestFrom.later', 'sentence.otherDaysStay'],
      ['sentence.notes.added'],
    ]);
  });
});

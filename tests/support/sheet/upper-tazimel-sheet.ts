import i18next from 'i18next';
import { texts } from '#shared/locales/en/print.js';
import { sheetWords } from '#server/print/sheet-words.js';
import type { PrintTranslator } from '#server/print/sheet-words.js';
import type { SheetEntry, SheetMarker, SheetModel } from '#shared/sheet/sheet-model.js';

const i18n = i18next.createInstance({
  lng: 'en',
  ns: ['print'],
  defaultNS: 'print',
  resources: { en: { print: texts } },
  interpolation: { escapeValue: false },
});
await i18n.init();
const fixed = i18n.getFixedT('en', 'print');

/** English words as the server hands them out. A key without a text fails the test. */
export const translate: PrintTranslator = (key, values) => {
  const text = fixed(key, values ?? {});
  if (text === key) throw new Error(`no English text for print:${key}`);
  return text;
};

export function words(year: number): SheetModel['words'] {
  return sheetWords({ translate, language: 'en-GB', year });
}

export function marker(change: Partial<SheetMarker> = {}): SheetMarker {
  return {
    letter: 'B',
    key: 'pleiades',
    isStar: true,
    icon: 'cluster',
    titles: { village: 'Ɓèŋu̍', officer: 'Cluster returns' },
    phenomenon: 'First morning seen',
    light: 'dawn',
    expected: '2027-06-07',
    early: '2027-06-03',
    late: '2027-06-12',
    whyNoDate: null,
    ...change,
  };
}

export function entry(change: Partial<SheetEntry> = {}): SheetEntry {
  return {
    number: 1,
    icon: 'sow',
    titles: { village: 'Ŋɔ́rɛ̃', officer: 'Sow long millet' },
    window: { earliest: '2027-06-10', bestFrom: '2027-06-14', bestTo: '2027-06-30', latest: '2027-07-05' },
    isWatch: false,
    fixedDate: null,
    dateSetBy: '',
    lastAdvised: null,
    signs: '',
    signsNeeded: null,
    ifLate: '',
    caution: '',
    whyNoDate: null,
    ...change,
  };
}

function window(earliest: string, bestFrom: string, bestTo: string, latest: string): SheetEntry['window'] {
  return { earliest, bestFrom, bestTo, latest };
}

/** The invented village of the demo as a sheet: plausible dates, not computed ones. */
export function upperTazimel(change: Partial<SheetModel> = {}): SheetModel {
  const markers: SheetMarker[] = [
    marker({
      letter: 'A',
      titles: { village: 'Ɓèŋu̍ tsʼá', officer: 'Cluster leaves' },
      phenomenon: 'Last evening seen',
      light: 'dusk',
      expected: '2027-05-05',
      early: '2027-05-01',
      late: '2027-05-09',
    }),
    marker(),
    marker({
      letter: 'C',
      key: 'orions-belt',
      icon: 'row',
      titles: { village: 'Tɔ́ ɗḭ́', officer: 'Belt returns' },
      expected: '2027-07-05',
      early: '2027-06-30',
      late: '2027-07-11',
    }),
    marker({
      letter: 'D',
      key: 'hr3982',
      icon: 'star',
      titles: { village: 'Ŋwa̰', officer: 'Regulus returns' },
      expected: '2027-09-06',
      early: '2027-09-01',
      late: '2027-09-12',
    }),
    marker({
      letter: 'E',
      key: 'hr5056',
      icon: 'star',
      titles: { village: '', officer: 'Spica leaves' },
      phenomenon: 'Last evening seen',
      light: 'dusk',
      expected: '2027-10-01',
      early: '2027-09-26',
      late: '2027-10-05',
    }),
    marker({
      letter: 'F',
      key: 'hr5056',
      icon: 'star',
      titles: { village: '', officer: 'Spica returns' },
      expected: '2027-10-30',
      early: '2027-10-26',
      late: '2027-11-04',
    }),
    marker({
      letter: 'G',
      key: 'hr6134',
      icon: 'star',
      titles: { village: '', officer: 'Antares leaves' },
      phenomenon: 'Last evening seen',
      light: 'dusk',
      expected: '2027-11-17',
      early: '2027-11-12',
      late: '2027-11-21',
    }),
  ];
  const entries: SheetEntry[] = [
    entry({
      number: 1,
      icon: 'wall',
      titles: { village: 'Tsʼíɗa̰ ŋú', officer: 'Mend terraces, spread manure' },
      window: window('2027-04-20', '2027-05-01', '2027-05-31', '2027-06-05'),
      signs: 'dusty west wind eases; first cloud build-up',
      signsNeeded: 1,
      ifLate: 'Carry on; no seed risk',
    }),
    entry({
      number: 2,
      icon: 'seed',
      titles: { village: 'Tsʼíɗa̰', officer: 'Seed check' },
      window: window('2027-05-10', '2027-05-15', '2027-05-30', '2027-06-10'),
      signs: 'Cluster not seen at dusk',
      ifLate: 'Do it anyway before the first rain',
    }),
    entry({
      number: 3,
      icon: 'feast',
      titles: { village: 'Ɓàlú ŋɔ̀', officer: 'Seed lending' },
      window: window('2027-06-01', '2027-06-05', '2027-06-14', '2027-06-20'),
      signs: 'Cluster seen at dawn by two people',
      ifLate: 'Hold it on the set market day',
    }),
    entry({
      number: 4,
      lastAdvised: { date: '2027-07-05', source: 'agricultural office' },
      signs: 'soil wet to a hand depth; weaver birds building; fig tree in new leaf',
      signsNeeded: 2,
      ifLate: 'After 5\u00a0July change to short millet; ask the agricultural office',
      caution: 'Do not put all seed in the ground at one time',
    }),
    entry({
      number: 5,
      icon: 'caution',
      titles: { village: 'Ŋɔ́rɛ̃ kʼò', officer: 'Last day, long millet' },
      window: window('2027-07-01', '2027-07-03', '2027-07-05', '2027-07-05'),
      fixedDate: '2027-07-05',
      signs: 'Belt seen at dawn (often clouded out)',
      ifLate: 'Stop sowing long millet; short millet only',
    }),
    entry({
      number: 6,
      icon: 'sow',
      titles: { village: 'Ŋɔ́ ɗí', officer: 'Sow short millet' },
      window: window('2027-06-20', '2027-07-01', '2027-07-20', '2027-07-25'),
      lastAdvised: { date: '2027-07-25', source: 'agricultural office' },
      signs: 'soil wet to a hand depth; frogs calling three nights',
      signsNeeded: 2,
      ifLate: 'After 25\u00a0July sow pulses or fodder; ask the agricultural office',
    }),
    entry({
      number: 7,
      icon: 'bird',
      titles: { village: 'Ƙàɓá', officer: 'Bird-scaring rota' },
      window: window('2027-09-01', '2027-09-06', '2027-10-10', '2027-10-20'),
      isWatch: true,
      signs: 'grain at milk stage; bird flocks at the stream',
      signsNeeded: 1,
      ifLate: 'Start when the grain is soft',
    }),
    entry({
      number: 8,
      icon: 'harvest',
      titles: { village: 'Rɛ̃ ɗí', officer: 'Harvest short millet' },
      window: window('2027-09-25', '2027-10-01', '2027-10-20', '2027-10-30'),
      signs: 'stem base dry; dawn dew heavy',
      signsNeeded: 1,
      ifLate: 'Cut before the grain drops',
    }),
    entry({
      number: 9,
      icon: 'harvest',
      titles: { village: 'Rɛ̃ ŋɔ́', officer: 'Harvest long millet' },
      window: window('2027-10-20', '2027-10-30', '2027-11-20', '2027-11-30'),
      signs: 'grain hard between the teeth',
      ifLate: 'Cut; guard against late showers',
    }),
    entry({
      number: 10,
      icon: 'store',
      titles: { village: 'Kʼóŋ', officer: 'Store-closing day' },
      window: window('2027-11-15', '2027-11-20', '2027-12-05', '2027-12-10'),
      ifLate: 'Any day after threshing',
    }),
  ];
  return {
    layout: 'month-cards',
    paper: 'A4',
    year: 2027,
    communityName: 'Upper Tazimel',
    placeName: 'Upper terraces',
    latitudeDeg: 12,
    label: '2027-1',
    stateWatermark: null,
    officerLanguage: 'en',
    villageLanguage: 'mis',
    markers,
    entries,
    moon: MOONS_2027,
    moonBegins: MOON_BEGINS_2027,
    contacts: { weather: '900', agriculture: '901' },
    basis: ['Dates: three-class rule, ordinary air, skyline of the upper terraces, engine 1.0.0.'],
    signedBy: 'two elders and the steward',
    printDate: '2027-01-15',
    words: words(2027),
    ...change,
  };
}

/** A day or two after each new Moon; the first stands for the Moon that the year begins in. */
const MOON_BEGINS_2027 = [
  '2026-12-10',
  '2027-01-09',
  '2027-02-08',
  '2027-03-09',
  '2027-04-08',
  '2027-05-07',
  '2027-06-06',
  '2027-07-05',
  '2027-08-04',
  '2027-09-02',
  '2027-10-02',
  '2027-10-31',
  '2027-11-30',
  '2027-12-29',
];

/** Near the true phases; only their look matters here. */
const MOONS_2027: SheetModel['moon'] = (
  [
    ['01-07 new', '01-15 first-quarter', '01-22 full', '01-29 last-quarter'],
    ['02-06 new', '02-14 first-quarter', '02-20 full', '02-28 last-quarter'],
    ['03-08 new', '03-15 first-quarter', '03-22 full', '03-30 last-quarter'],
    ['04-06 new', '04-13 first-quarter', '04-20 full', '04-28 last-quarter'],
    ['05-06 new', '05-13 first-quarter', '05-20 full', '05-28 last-quarter'],
    ['06-04 new', '06-11 first-quarter', '06-19 full', '06-27 last-quarter'],
    ['07-04 new', '07-10 first-quarter', '07-18 full', '07-26 last-quarter'],
    ['08-02 new', '08-09 first-quarter', '08-17 full', '08-25 last-quarter', '08-31 new'],
    ['09-07 first-quarter', '09-15 full', '09-23 last-quarter', '09-30 new'],
    ['10-07 first-quarter', '10-15 full', '10-22 last-quarter', '10-29 new'],
    ['11-06 first-quarter', '11-14 full', '11-21 last-quarter', '11-28 new'],
    ['12-06 first-quarter', '12-13 full', '12-20 last-quarter', '12-27 new'],
  ] as const
)
  .flat()
  .map((text) => {
    const [date = '', phase = 'new'] = text.split(' ');
    return { date: `2027-${date}`, phase: phase as SheetModel['moon'][number]['phase'] };
  });

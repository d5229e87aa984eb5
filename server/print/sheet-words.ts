import { civilDate } from '#shared/sheet/civil-days.js';
import type { SheetWords } from '#shared/sheet/sheet-words.js';

/** A translator bound to the namespace `print`, e.g. i18next's `getFixedT(language, 'print')`; must not escape HTML. */
export type PrintTranslator = (key: string, values?: Record<string, string | number>) => string;

export interface SheetWordsInput {
  readonly translate: PrintTranslator;
  /** Language of the fixed words, as a tag; months and weekdays are named in it. */
  readonly language: string;
  /** Dates outside this year are written with their year. */
  readonly year: number;
  /** The village's own twelve month names, where it has given them. */
  readonly villageMonths?: readonly string[];
}

/** The fixed words of a sheet in one language. */
export function sheetWords({ translate: t, language, year, villageMonths }: SheetWordsInput): SheetWords {
  const months = monthNames(language, 'long');
  const monthsShort = monthNames(language, 'short');
  const weekdays = weekdayNames(language);
  const list = (items: readonly string[]): string =>
    new Intl.ListFormat(language, { type: 'unit', style: 'short' }).format(items);

  const parts = (iso: string): { day: number; month: string; year: number } => {
    const date = civilDate(iso);
    return { day: date.day, month: months[date.month - 1] ?? '', year: date.year };
  };
  const dayAndYear = (iso: string): string => t('date.dayAndYear', parts(iso));
  const day = (iso: string): string =>
    civilDate(iso).year === year ? t('date.day', parts(iso)) : dayAndYear(iso);
  const range = (from: string, to: string): string => {
    if (from === to) return day(from);
    if (from.slice(0, 7) === to.slice(0, 7)) {
      return t('date.withinMonth', { fromDay: civilDate(from).day, to: day(to) });
    }
    return t('date.across', { from: day(from), to: day(to) });
  };
  /** Two ends for a sentence; the month is said once where both are in it. */
  const between = (from: string, to: string): { from: string; to: string } => ({
    from: from.slice(0, 7) === to.slice(0, 7) ? String(civilDate(from).day) : day(from),
    to: day(to),
  });
  const end = (text: string): string => text.trim().replace(/[.;]+$/u, '');
  const contact = (text: string): string => (text.trim() === '' ? t('foot.missing') : end(text));

  return {
    monthName: (month) => ({
      village: villageMonths?.[month - 1] ?? '',
      officer: months[month - 1] ?? '',
    }),
    monthShort: (month) => monthsShort[month - 1] ?? '',
    weekdayShort: (isoWeekday) => weekdays[isoWeekday - 1] ?? '',
    day,
    range,

    noDateHeading: (of) => t('card.noDateHeading', { year: of }),
    holes: (of) => t('card.holes', of),
    moonPhases: (phases) =>
      t('card.moons', { phases: list(phases.map((phase) => t(`card.phase.${phase}`))) }),
    moreOnNextCard: (month) => t('card.moreOnNextCard', { month }),
    cardOf: (of) => t('card.cardOf', of),
    leapYearsOnly: (years) => t('card.leapYears', { years: list(years.map(String)) }),
    leapYearsShort: (years) => t('card.leapYearsShort', { years: list(years.map(String)) }),
    moreBars: (count) => t('card.moreBars', { count }),

    markerSentence: ({ phenomenon, date, from, to }) =>
      from === to
        ? t('marker.sentenceOneDay', { phenomenon, date: day(date) })
        : t('marker.sentence', { phenomenon, date: day(date), range: range(from, to) }),
    markerMayCome: ({ title, from, to }) => t('marker.mayCome', { title, ...between(from, to) }),
    bestDays: () => t('entry.best'),
    bestFromTo: ({ from, to }) => t('entry.bestFromTo', { range: range(from, to) }),
    earlyFrom: ({ title, date }) => t('entry.earlyFrom', { title, date: day(date) }),
    lateUntil: ({ title, date }) => t('entry.lateUntil', { title, date: day(date) }),
    watchDays: () => t('entry.watch'),
    watchFromTo: ({ from, to }) => t('entry.watchFromTo', { range: range(from, to) }),
    fixedDay: () => t('entry.fixed'),
    fixedOn: (date) => t('entry.fixedOn', { date: day(date) }),
    dateSetBy: (source) => t('entry.dateSetBy', { source: end(source) }),
    lastAdvised: ({ date, source }) =>
      source.trim() === ''
        ? t('entry.lastAdvisedNoSource', { date: day(date) })
        : t('entry.lastAdvised', { date: day(date), source: end(source) }),
    lookFor: ({ signs, needed }) =>
      needed === null || needed < 1
        ? t('entry.lookFor', { signs: end(signs) })
        : t('entry.lookForSome', { signs: end(signs), count: needed }),
    signs: ({ signs, needed }) =>
      needed === null || needed < 1
        ? t('entry.signs', { signs: end(signs) })
        : t('entry.signsSome', { signs: end(signs), count: needed }),
    tickSigns: ({ count, mustHave }) =>
      mustHave === ''
        ? t('entry.tickSigns', { count })
        : t('entry.tickSignsMust', { count, name: end(mustHave) }),
    ifLate: (rule) => t('entry.ifLate', { rule: end(rule) }),
    takeCare: (caution) => t('entry.takeCare', { caution: end(caution) }),
    notice: ({ text, issuer, issued, expires }) =>
      t('notice', { issuer, issued: dayAndYear(issued), expires: dayAndYear(expires), text: end(text) }),
    stopOn: ({ date, source }) => t('entry.stopOn', { date: day(date), source: end(source) }),
    checkedBy: ({ texts, office, name, date }) =>
      t('entry.checkedBy', {
        ...{ office, name, date: dayAndYear(date) },
        texts: list(texts.map((text) => t(`entry.checkedText.${text}`))),
      }),
    noDateBecause: (of) => t('entry.noDateBecause', of),
    noDate: (title) => (title === '' ? t('entry.noDateUntitled') : t('entry.noDate', { title })),

    legendBest: () => t('legend.best'),
    legendMargin: () => t('legend.margin'),
    legendWatch: () => t('legend.watch'),
    legendFixed: () => t('legend.fixed'),
    legendLastAdvised: () => t('legend.lastAdvised'),
    legendMarker: (of) => t(`legend.${of}`),
    legendMoonDay: () => t('legend.moonDay'),
    columnLook: () => t('legend.look'),
    columnDo: () => t('legend.do'),
    columnIfLate: () => t('legend.ifLate'),
    legendTitle: () => t('legend.title'),

    shortCaution: () => t('foot.caution'),
    eyesCaution: () => t('foot.eyes'),
    contacts: ({ weather, agriculture }) =>
      t('foot.contacts', { weather: contact(weather), agriculture: contact(agriculture) }),
    contactsElsewhere: () => t('foot.contactsElsewhere'),
    measureAcross: () => t('foot.measureAcross'),
    measureDown: () => t('foot.measureDown'),
    fullSize: () => t('foot.fullSize'),
    pegAndDrill: (of) => t('foot.pegAndDrill', of),
    signedBy: (names) => t('foot.signedBy', { names: end(names) }),
    printed: (date) => t('foot.printed', { date: dayAndYear(date) }),
    issueForPlace: (of) => t('foot.issueForPlace', of),

    boardTitle: (of) => t('board.title', of),
    tileDays: (of) => t('board.tile', of),
    top: () => t('board.top'),
    glueHere: () => t('board.glueHere'),
    printFirst: (code) => t('board.printFirst', { code }),
  };
}

function monthNames(language: string, width: 'long' | 'short'): string[] {
  const format = new Intl.DateTimeFormat(language, { month: width, timeZone: 'UTC' });
  return Array.from({ length: 12 }, (_, index) => format.format(new Date(Date.UTC(2001, index, 15))));
}

/** From Monday. */
function weekdayNames(language: string): string[] {
  const format = new Intl.DateTimeFormat(language, { weekday: 'short', timeZone: 'UTC' });
  return Array.from({ length: 7 }, (_, index) => format.format(new Date(Date.UTC(2001, 0, 1 + index))));
}

import type { Label, MoonPhase, SheetCheck, SheetNotice } from './sheet-model.js';

/**
 * Every fixed word of a sheet, already in the officer's language. The geometry asks for sentences by what
 * they say and never joins fragments of a sentence itself.
 */
export interface SheetWords {
  // Names
  monthName(month: number): Label;
  monthShort(month: number): string;
  /** 1 is Monday. */
  weekdayShort(isoWeekday: number): string;

  // Dates; a year is added where it is not the sheet's own
  day(date: string): string;
  range(from: string, to: string): string;

  // A month's card
  /** Heading over what has no date in the sheet's year. */
  noDateHeading(year: number): string;
  holes(of: { row: number; first: number; last: number }): string;
  moonPhases(phases: readonly MoonPhase[]): string;
  moreOnNextCard(month: string): string;
  cardOf(of: { month: string; card: number; cards: number }): string;
  leapYearsOnly(years: readonly number[]): string;
  /** The same in a few words, for a board's narrow gap. */
  leapYearsShort(years: readonly number[]): string;
  /** Bars that a week's row has no room for. */
  moreBars(count: number): string;

  // Markers and entries
  /** The phenomenon's name already says morning or evening. */
  markerSentence(of: { phenomenon: string; date: string; from: string; to: string }): string;
  markerMayCome(of: { title: string; from: string; to: string }): string;
  bestDays(): string;
  bestFromTo(of: { from: string; to: string }): string;
  earlyFrom(of: { title: string; date: string }): string;
  lateUntil(of: { title: string; date: string }): string;
  watchDays(): string;
  watchFromTo(of: { from: string; to: string }): string;
  fixedDay(): string;
  fixedOn(date: string): string;
  dateSetBy(source: string): string;
  lastAdvised(of: { date: string; source: string }): string;
  lookFor(of: { signs: string; needed: number | null }): string;
  /** The signs without the words that open the sentence, for under a heading. */
  signs(of: { signs: string; needed: number | null }): string;
  /** Beside empty circles; `mustHave` is empty where no sign is. */
  tickSigns(of: { count: number; mustHave: string }): string;
  ifLate(rule: string): string;
  takeCare(caution: string): string;
  notice(notice: SheetNotice): string;
  stopOn(of: { date: string; source: string }): string;
  checkedBy(check: SheetCheck): string;
  noDateBecause(of: { title: string; reason: string }): string;
  noDate(title: string): string;

  // Legend
  legendBest(): string;
  legendMargin(): string;
  legendWatch(): string;
  legendFixed(): string;
  legendLastAdvised(): string;
  legendMarker(of: 'star' | 'sign' | 'both'): string;
  legendMoonDay(): string;
  columnLook(): string;
  columnDo(): string;
  columnIfLate(): string;
  legendTitle(): string;

  // Foot of every page
  shortCaution(): string;
  eyesCaution(): string;
  contacts(of: { weather: string; agriculture: string }): string;
  /** Where a tile has no room for the contacts themselves. */
  contactsElsewhere(): string;
  measureAcross(): string;
  measureDown(): string;
  fullSize(): string;
  pegAndDrill(of: { pegMm: number; drillMm: number }): string;
  signedBy(names: string): string;
  printed(date: string): string;
  issueForPlace(of: { issue: string; place: string }): string;

  // The year board
  boardTitle(of: { community: string; issue: string }): string;
  tileDays(of: { code: string; from: number; to: number; fromMonth: string; toMonth: string }): string;
  top(): string;
  glueHere(): string;
  printFirst(code: string): string;
}

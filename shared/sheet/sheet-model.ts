import type { IsoWeekday } from './civil-days.js';
import type { IconKey } from './icons.js';
import type { SheetWords } from './sheet-words.js';

/**
 * All that a printed board says, before it has a shape. It knows no server, no language files and no person:
 * whoever builds it has already left out every entry that the reader of the sheet may not see.
 * Dates are civil Gregorian, `YYYY-MM-DD`.
 */

export type SheetLayout = 'month-cards' | 'year-board';

/** The same thing in the village's and in the officer's language; either may be empty. */
export interface Label {
  readonly village: string;
  readonly officer: string;
}

export interface SheetMarker {
  /** The round letter that stands for it on the board. */
  readonly letter: string;
  readonly key: string;
  /** False for a sign of the Sun, the nights or the Moon. */
  readonly isStar: boolean;
  readonly icon: IconKey;
  readonly titles: Label;
  /** Plain name of what is seen, e.g. "first morning seen"; already translated. */
  readonly phenomenon: string;
  readonly light: 'dawn' | 'dusk';
  readonly expected: string | null;
  readonly early: string | null;
  readonly late: string | null;
  /** A plain sentence where there is no date this year. */
  readonly whyNoDate: string | null;
}

export interface SheetWindow {
  readonly earliest: string | null;
  readonly bestFrom: string | null;
  readonly bestTo: string | null;
  readonly latest: string | null;
}

export interface SheetEntry {
  readonly number: number;
  readonly icon: IconKey;
  readonly titles: Label;
  /** May begin in the year before or end in the year after. */
  readonly window: SheetWindow;
  /** A watch against frost, flood, birds: an open bar, never cut short by a last date. */
  readonly isWatch: boolean;
  readonly fixedDate: string | null;
  /** Who set the date that its days count from; empty where a sign leads, or where the last date says it already. */
  readonly dateSetBy: string;
  readonly lastAdvised: { readonly date: string; readonly source: string } | null;
  readonly signs: string;
  /** So many circles stand beside them, to be ticked with a pencil. */
  readonly signsNeeded: number | null;
  /** The sign without which nothing begins; left out where there is none. */
  readonly mustHaveSign?: string;
  readonly ifLate: string;
  readonly caution: string;
  /** The day on which to stop, and whose word that is. */
  readonly stop?: { readonly date: string; readonly source: string } | null;
  /** Who of which office read its texts; each office once. */
  readonly checked?: readonly SheetCheck[];
  readonly whyNoDate: string | null;
}

export const CHECKED_TEXTS = ['work', 'safety', 'late'] as const;

/** Which of an entry's texts somebody of an office read and let stand, and when. */
export interface SheetCheck {
  readonly texts: readonly (typeof CHECKED_TEXTS)[number][];
  readonly office: string;
  readonly name: string;
  readonly date: string;
}

export type MoonPhase = 'new' | 'first-quarter' | 'full' | 'last-quarter';

export interface SheetMoon {
  readonly phase: MoonPhase;
  readonly date: string;
}

/** What the weather service says on the day of printing. */
export interface SheetNotice {
  readonly text: string;
  readonly issuer: string;
  readonly issued: string;
  /** The last day on which it holds. */
  readonly expires: string;
}

/** Sentences about single entries, a line each, and which board they compare with. */
export interface SheetChanges {
  readonly title: string;
  readonly lines: readonly string[];
}

export interface SheetModel {
  readonly layout: SheetLayout;
  readonly paper: 'A4';
  readonly year: number;
  /** With which day a week's row begins; Monday where it is left out. */
  readonly firstWeekday?: IsoWeekday;
  readonly communityName: string;
  readonly placeName: string;
  /** North positive; the Moon's lit side is drawn as it stands there. */
  readonly latitudeDeg: number;
  /** `2027-1` for what was published, else null. */
  readonly label: string | null;
  /** What is written across every page of anything that must not hang on the wall, e.g. "Draft". */
  readonly stateWatermark: string | null;
  readonly officerLanguage: string;
  readonly villageLanguage: string;
  readonly markers: readonly SheetMarker[];
  readonly entries: readonly SheetEntry[];
  /** They stand above the work of the months in which they hold. */
  readonly notices?: readonly SheetNotice[];
  readonly moon: readonly SheetMoon[];
  /** Days on which a Moon's days begin to be counted, in order, from the one before the year on; empty for none. */
  readonly moonBegins: readonly string[];
  readonly contacts: { readonly weather: string; readonly agriculture: string };
  /** What the dates rest on; one statement a line. */
  readonly basis: readonly string[];
  /** What it says otherwise than the board before it in the same year; left out where that is nothing. */
  readonly changes?: SheetChanges;
  readonly signedBy: string;
  readonly printDate: string;
  readonly words: SheetWords;
}

/** A model from which no honest sheet can be made. */
export class SheetModelError extends Error {
  override readonly name = 'SheetModelError';
}

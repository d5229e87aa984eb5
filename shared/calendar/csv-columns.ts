/**
 * How a calendar stands in a table: one line an entry, and behind it one for each other keeper's timing of it, under one
 * line of titles. Every line has a number, by which others of the same table name it: `leadEntry` the entry from which days
 * are counted, `variantOf` the entry whose timing this is, `boardVariant` the timing that drives the board. Whoever writes such a file and whoever
 * reads one go by this list; titles are words of a language (`tables.ts`, `column.<id>`), ids never change.
 *
 * - `text`: words as they are; what a spreadsheet would run as a formula has an apostrophe in front (`csvText` puts it
 *   there, `csvWords` takes it off), numbers such as -5 have none
 * - `code`: a word of a closed list of the contracts, e.g. `farm`, `heliacal-rising`; a kind may stand in the village's word
 * - `whole-number`: digits with an optional minus; offsets count days from the leading day
 * - `iso-date`: `YYYY-MM-DD`, Gregorian
 * - `month-day`: `MM-DD`, a day of every year
 * - `yes-no`: `yes` or `no`
 * - `json`: a lead that has no columns of its own, as canonical JSON
 * - `parts`: lines of parts with bars between (`shared/kernel/cell-parts.ts`): signs as kind, name, what to look for, where,
 *   usual from, usual to, still seen; an office's check as name, office, day
 *
 * An empty cell says nothing. `given` columns make an entry when they are read back; `computed` ones are what the engine
 * made of it, `about` ones say where the file comes from: both are passed over.
 */
export type CsvColumnKind =
  'text' | 'code' | 'whole-number' | 'iso-date' | 'month-day' | 'yes-no' | 'json' | 'parts';
export type CsvColumnPart = 'given' | 'computed' | 'about';

export interface CsvColumn {
  id: string;
  kind: CsvColumnKind;
  part: CsvColumnPart;
}

const column = <Id extends string>(id: Id, kind: CsvColumnKind, part: CsvColumnPart = 'given') => ({
  ...{ id, kind, part },
});

export const CALENDAR_CSV_COLUMNS = [
  column('number', 'whole-number'),
  column('titleVillage', 'text'),
  column('titleOfficer', 'text'),
  column('kind', 'code'),
  column('icon', 'code'),
  column('crop', 'text'),
  column('earliest', 'iso-date', 'computed'),
  column('bestFrom', 'iso-date', 'computed'),
  column('bestTo', 'iso-date', 'computed'),
  column('lastAdvised', 'iso-date', 'computed'),
  column('signExpected', 'iso-date', 'computed'),
  column('signEarly', 'iso-date', 'computed'),
  column('signLate', 'iso-date', 'computed'),
  column('leadType', 'code'),
  column('leadMarker', 'code'),
  column('leadPhenomenon', 'code'),
  column('leadOccurrence', 'whole-number'),
  column('leadDate', 'month-day'),
  column('leadSource', 'text'),
  column('leadOther', 'json'),
  column('leadEntry', 'whole-number'),
  column('leadDay', 'code'),
  column('usualFrom', 'month-day'),
  column('usualTo', 'month-day'),
  column('earliestDays', 'whole-number'),
  column('bestFromDays', 'whole-number'),
  column('bestToDays', 'whole-number'),
  column('lastAdvisedDays', 'whole-number'),
  column('lastDate', 'month-day'),
  column('lastDateSource', 'text'),
  column('protectiveWatch', 'yes-no'),
  column('otherSigns', 'text'),
  column('ifLate', 'text'),
  column('operation', 'code'),
  column('ownOperation', 'text'),
  column('variety', 'text'),
  column('varietyFromDays', 'whole-number'),
  column('varietyToDays', 'whole-number'),
  column('land', 'text'),
  column('readyDays', 'whole-number'),
  column('graceDays', 'whole-number'),
  column('repeats', 'code'),
  column('everyYears', 'whole-number'),
  column('repeatRule', 'text'),
  column('signs', 'parts'),
  column('signsNeeded', 'whole-number'),
  column('mustHaveSign', 'whole-number'),
  column('responsible', 'text'),
  column('helpers', 'text'),
  column('decides', 'text'),
  column('owns', 'text'),
  column('inputs', 'text'),
  column('ifEarly', 'text'),
  column('ifLaterStill', 'text'),
  column('stopDate', 'month-day'),
  column('stopSource', 'text'),
  column('askWhom', 'text'),
  column('confidence', 'code'),
  column('confidenceBy', 'text'),
  column('basis', 'code'),
  column('sinceYear', 'whole-number'),
  column('heardWhere', 'text'),
  column('heardDay', 'iso-date'),
  column('heardLanguage', 'text'),
  column('checkedWork', 'parts'),
  column('checkedSafety', 'parts'),
  column('checkedLate', 'parts'),
  column('caution', 'text'),
  column('notes', 'text'),
  column('giver', 'text'),
  column('variantOf', 'whole-number'),
  column('variantDifference', 'code'),
  column('variantConfidence', 'code'),
  column('variantBasis', 'code'),
  column('boardShows', 'code'),
  column('boardVariant', 'whole-number'),
  column('boardReason', 'text'),
  column('level', 'code', 'about'),
  column('year', 'whole-number', 'about'),
  column('place', 'text', 'about'),
  column('issue', 'text', 'about'),
  column('care', 'text', 'about'),
] as const satisfies readonly CsvColumn[];

export type CalendarCsvColumn = (typeof CALENDAR_CSV_COLUMNS)[number]['id'];

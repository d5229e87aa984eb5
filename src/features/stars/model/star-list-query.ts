import { DOES, type Does, type StarChoice } from './star-choice.js';
import { readYear } from '#src/lib/civil-year.js';

export const SORT_KEYS = [
  'name',
  'heliacal-setting',
  'nightsHidden',
  'heliacal-rising',
  'acronychal-rising',
  'cosmical-setting',
  'vMag',
] as const;
export type SortKey = (typeof SORT_KEYS)[number];

/** What the list of stars shows, as it stands in the address: it survives going to a star and back. */
export interface StarListQuery extends StarChoice {
  year: number;
  sort: SortKey;
  descending: boolean;
  rows: number;
}

export const ROWS_STEP = 50;
const ROWS_MAX = 1000;

/** @param thisYear the year at the place, where the address names none */
export function readListQuery(search: URLSearchParams, thisYear: number): StarListQuery {
  const sort = search.get('sort') ?? '';
  const bare = sort.replace(/^-/u, '');
  const rows = Number(search.get('rows'));
  return {
    year: readYear(search.get('year') ?? '') ?? thisYear,
    search: search.get('q') ?? '',
    show: search.get('show') === 'all' ? 'all' : 'good',
    does: oneOf(DOES, search.get('does')) ?? ('any' satisfies Does),
    sort: oneOf(SORT_KEYS, bare) ?? 'heliacal-rising',
    descending: sort.startsWith('-'),
    rows: Number.isInteger(rows) && rows > ROWS_STEP && rows <= ROWS_MAX ? rows : ROWS_STEP,
  };
}

/** The other way round; what is usual stays out of the address. Other parts of the address stay as they are. */
export function writeListQuery(
  before: URLSearchParams,
  query: StarListQuery,
  thisYear: number,
): URLSearchParams {
  const after = new URLSearchParams(before);
  const put = (key: string, value: string, usual: string) => {
    if (value === usual) after.delete(key);
    else after.set(key, value);
  };
  put('year', String(query.year), String(thisYear));
  put('q', query.search.trim(), '');
  put('show', query.show, 'good');
  put('does', query.does, 'any');
  put('sort', `${query.descending ? '-' : ''}${query.sort}`, 'heliacal-rising');
  put('rows', String(query.rows), String(ROWS_STEP));
  return after;
}

function oneOf<T extends string>(list: readonly T[], value: string | null): T | null {
  return list.find((each) => each === value) ?? null;
}

import {
  createColumnHelper,
  createSortedRowModel,
  rowSortingFeature,
  sortFn_basic,
  tableFeatures,
} from '@tanstack/react-table';
import type { Phenomenon } from '#shared/sky/vocabulary.js';
import { dayOf, hiddenOf, type StarRow } from '../model/star-rows.js';
import { DayCell, HiddenCell, MagnitudeCell, StripCell } from './star-cells.js';

/** Names sort as a reader expects: HR 98 before HR 105, É beside E. */
const byName = new Intl.Collator(undefined, { numeric: true });

export const starFeatures = tableFeatures({
  rowSortingFeature,
  sortedRowModel: createSortedRowModel(),
  sortFns: { basic: sortFn_basic },
});

const helper = createColumnHelper<typeof starFeatures, StarRow>();

function dayColumn(phenomenon: Phenomenon) {
  return helper.accessor((star) => dayOf(star.row, phenomenon), {
    id: phenomenon,
    sortFn: 'basic',
    sortUndefined: 'last',
    cell: ({ row }) => <DayCell row={row.original.row} phenomenon={phenomenon} />,
  });
}

/** Columns in the order of the year: last seen, hidden, back again, then the two of the other half of the night. */
export const starColumns = helper.columns([
  helper.accessor('title', {
    id: 'name',
    sortFn: (a, b) => byName.compare(a.original.title, b.original.title),
  }),
  helper.display({ id: 'strip', cell: ({ row }) => <StripCell star={row.original} /> }),
  dayColumn('heliacal-setting'),
  helper.accessor((star) => hiddenOf(star.row), {
    id: 'nightsHidden',
    sortFn: 'basic',
    sortUndefined: 'last',
    cell: ({ row }) => <HiddenCell row={row.original.row} />,
  }),
  dayColumn('heliacal-rising'),
  dayColumn('acronychal-rising'),
  dayColumn('cosmical-setting'),
  helper.accessor((star) => star.row.vMag, {
    id: 'vMag',
    sortFn: 'basic',
    cell: ({ row }) => <MagnitudeCell row={row.original.row} />,
  }),
]);

/** Columns over which the one sentence stands where a star has no dates. */
export const DATE_COLUMNS: ReadonlySet<string> = new Set([
  'heliacal-setting',
  'nightsHidden',
  'heliacal-rising',
  'acronychal-rising',
  'cosmical-setting',
]);

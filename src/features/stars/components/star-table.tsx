import { type ReactTable } from '@tanstack/react-table';
import { memo } from 'react';
import { useTranslation } from 'react-i18next';
import { MonthScale } from '#src/ui/pictures/month-scale.js';
import { ariaSort, SortKey, Table } from '#src/ui/table.js';
import { noDates } from '../model/row-outcome.js';
import type { SortKey as SortColumn } from '../model/star-list-query.js';
import type { StarRow } from '../model/star-rows.js';
import { StarName } from './star-cells.js';
import { DATE_COLUMNS, type starFeatures } from './star-columns.js';
import { useStarTableFacts } from './star-table-context.js';

export type StarsTable = ReactTable<typeof starFeatures, StarRow>;
type TableRow = ReturnType<StarsTable['getRowModel']>['rows'][number];

export interface StarTableProps {
  table: StarsTable;
  rows: readonly TableRow[];
  caption: string;
  onSort: (column: SortColumn) => void;
}

/** From 700 px: a lane in every row, a range under each date, one sentence where there is no date. */
export function StarTable({ table, rows, caption, onSort }: StarTableProps) {
  return (
    <Table
      caption={caption}
      middle
      className="table-fixed [&_td]:px-1.5 [&_th]:px-1.5 wide:[&_td]:px-2 wide:[&_th]:px-2"
    >
      <colgroup>
        <col className="w-[17%]" />
        <col className="w-[12.5%] wide:w-[19%]" />
        <col className="w-[12.25%] wide:w-[12%]" />
        <col className="w-[9%] wide:w-[7.5%]" />
        <col className="w-[12.25%] wide:w-[12%]" />
        <col className="w-[12.25%] wide:w-[12%]" />
        <col className="w-[12.25%] wide:w-[12%]" />
        <col className="w-[12.5%] wide:w-[8.5%]" />
      </colgroup>
      <thead>
        <tr>
          {table.getHeaderGroups()[0]?.headers.map((header) => {
            const column = header.column.id;
            if (column === 'strip') return <StripHead key={column} />;
            const direction = header.column.getIsSorted();
            return (
              <th key={column} scope="col" aria-sort={ariaSort(direction)}>
                <ColumnKey column={column as SortColumn} direction={direction} onSort={onSort} />
              </th>
            );
          })}
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <StarTableRow key={row.id} table={table} row={row} />
        ))}
      </tbody>
    </Table>
  );
}

function ColumnKey({
  column,
  direction,
  onSort,
}: {
  column: SortColumn;
  direction: ReturnType<StarsTable['getHeaderGroups']>[number]['headers'][number]['column'] extends {
    getIsSorted: () => infer D;
  }
    ? D
    : never;
  onSort: (column: SortColumn) => void;
}) {
  const { t } = useTranslation(['stars', 'sky']);
  const label =
    column === 'name'
      ? t('column.star')
      : column === 'nightsHidden'
        ? t('column.hidden')
        : column === 'vMag'
          ? t('column.magnitude')
          : t(`sky:phenomenonTitle.${column}`);
  return (
    <SortKey
      label={label}
      direction={direction}
      onSort={() => {
        onSort(column);
      }}
    />
  );
}

function StripHead() {
  const { t } = useTranslation('stars');
  const { dates, firstDayNumber, lastDayNumber } = useStarTableFacts();
  return (
    <th scope="col">
      {t('column.strip')}
      <span className="hidden wide:block">
        <MonthScale span={{ first: firstDayNumber, last: lastDayNumber }} months={dates.months} />
      </span>
    </th>
  );
}

/** A row depends on its star alone: sorting and searching move rows, they do not draw them anew. */
const StarTableRow = memo(DrawnRow, (before, after) => before.row.original === after.row.original);

function DrawnRow({ table, row }: { table: StarsTable; row: TableRow }) {
  const { t } = useTranslation('stars');
  const { latitudeDeg, dates } = useStarTableFacts();
  const why = noDates(row.original.row, latitudeDeg);
  const cells = row.getAllCells();
  return (
    <tr>
      {cells.map((cell, index) => {
        const column = cell.column.id;
        if (column === 'name') {
          return (
            <th key={column} scope="row">
              <StarName star={row.original} />
            </th>
          );
        }
        if (why !== null && DATE_COLUMNS.has(column)) {
          const isFirst = !DATE_COLUMNS.has(cells[index - 1]?.column.id ?? '');
          return isFirst ? (
            <td key={column} colSpan={DATE_COLUMNS.size}>
              {t(`none.${why}`, { year: dates.year })}
            </td>
          ) : null;
        }
        return (
          <td key={column}>
            <table.FlexRender cell={cell} />
          </td>
        );
      })}
    </tr>
  );
}

import type { GridApi, GridColDef, GridRowId, GridValidRowModel } from '@mui/x-data-grid';
import { plainText } from './copyTsv';

export type CopiedCell = string | number | null;

/** A column of a data table. */
export type DataColumn<Row extends GridValidRowModel> = GridColDef<Row> & {
  /** What the clipboard gets where the shown text is not it; `false` leaves the column out (drawings, buttons). */
  copied?: ((row: Row) => CopiedCell) | false;
};

/** Heads and the given rows of a data table as they stand on the screen, for the clipboard. */
export function gridText(grid: GridApi, ids: readonly GridRowId[]): CopiedCell[][] {
  const columns = (grid.getVisibleColumns() as DataColumn<GridValidRowModel>[]).filter(
    ({ field, type, copied }) => field !== '__check__' && type !== 'actions' && copied !== false,
  );
  const cells = (id: GridRowId): CopiedCell[] =>
    columns.map(({ field, copied }) => {
      const { row, formattedValue, value } = grid.getCellParams<GridValidRowModel>(id, field);
      return copied ? copied(row) : shownText(formattedValue ?? value);
    });
  return [columns.map(({ headerName, field }) => headerName || field), ...ids.map(cells)];
}

function shownText(value: unknown): CopiedCell {
  if (typeof value === 'string') return plainText(value);
  return typeof value === 'number' ? value : null;
}

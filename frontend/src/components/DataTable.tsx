import Box from '@mui/material/Box';
import useMediaQuery from '@mui/material/useMediaQuery';
import {
  DataGrid,
  type GridRowId,
  type GridRowSelectionModel,
  type GridSortModel,
  type GridValidRowModel,
  useGridApiRef,
} from '@mui/x-data-grid';
import { useMemo, useRef, useState, type KeyboardEvent, type ReactNode } from 'react';
import type { Problem } from '../api/problem';
import { copiedWords, copyTsv } from './copyTsv';
import { ErrorState } from './ErrorState';
import { gridText, type CopiedCell, type DataColumn } from './gridText';
import { useNotices } from './Notices';
import { SelectableFooter } from './SelectableFooter';
import type { ListState } from './useListState';

interface DataTableProps<Row extends GridValidRowModel> {
  label: string;
  columns: DataColumn<Row>[];
  rows: readonly Row[] | undefined;
  /** Rows in all, as the server counts; undefined while not known. */
  total: number | undefined;
  getRowId: (row: Row) => GridRowId;
  state: Pick<ListState<string>, 'page' | 'size' | 'sort' | 'setPage' | 'setSort'>;
  loading: boolean;
  problem: Problem | null;
  onRetry: () => void;
  onOpen: (row: Row) => void;
  /** Stands in place of rows when there are none. */
  empty: ReactNode;
  /** Heads and rows for the clipboard where they are more than the columns on the screen. */
  copied?: (rows: readonly Row[]) => CopiedCell[][];
  hidden?: Record<string, boolean>;
  height?: string;
  /** px; 32 unless the rows carry a drawing. */
  rowHeight?: number;
}

const NO_SORT = { field: '', down: false };
const NONE: GridRowSelectionModel = { type: 'include', ids: new Set() };

/**
 * A server-side table on the community data grid. Filters and the second sort key live outside (the grid has one of
 * each); the address holds page and sort; the row count stays steady while the next page is on its way.
 */
export function DataTable<Row extends GridValidRowModel>(props: DataTableProps<Row>) {
  const { state, problem } = props;
  // The last known count stands while a page loads, and until there is one there are rows enough for the page that the
  // address asks for; the grid would go back to its first page otherwise.
  const [known, setKnown] = useState(0);
  if (props.total !== undefined && props.total !== known) setKnown(props.total);
  const rowCount = props.total ?? Math.max(known, state.page * state.size);
  // The grid goes to its first page by itself when it starts. That is not the reader's wish, who may have followed a link
  // to page 12: only what comes after a click or a key counts, or a page that does not exist.
  const touched = useRef(false);
  const touch = () => {
    touched.current = true;
  };
  const beyond = props.total !== undefined && state.page > 1 && (state.page - 1) * state.size >= props.total;
  const [{ field, down } = NO_SORT] = state.sort;
  // The same objects as long as they say the same: the grid takes new ones for a change, and starts over.
  const sortModel = useMemo<GridSortModel>(
    () => (field === '' ? [] : [{ field, sort: down ? 'desc' : 'asc' }]),
    [field, down],
  );
  const paginationModel = useMemo(
    () => ({ page: state.page - 1, pageSize: state.size }),
    [state.page, state.size],
  );
  const grid = useGridApiRef();
  const { tell } = useNotices();
  const [selection, setSelection] = useState(NONE);
  const narrow = useMediaQuery('(max-width: 600px)');
  const chosen = (props.rows ?? []).filter(
    (row) => selection.ids.has(props.getRowId(row)) === (selection.type === 'include'),
  );

  async function copy(): Promise<void> {
    if (!grid.current) return;
    const rows = props.copied ? props.copied(chosen) : gridText(grid.current, chosen.map(props.getRowId));
    tell(copiedWords(await copyTsv(rows), chosen.length));
  }

  // Ahead of the grid's own copying, which leaves out the heads.
  function copyOnKey(event: KeyboardEvent): void {
    const asked = (event.ctrlKey || event.metaKey) && !event.shiftKey && event.key.toLowerCase() === 'c';
    if (!asked || chosen.length === 0 || document.getSelection()?.toString()) return;
    event.preventDefault();
    event.stopPropagation();
    void copy();
  }

  if (problem !== null && props.rows === undefined) {
    return <ErrorState problem={problem} onRetry={props.onRetry} what={props.label.toLowerCase()} />;
  }
  return (
    <Box
      onClickCapture={touch}
      onKeyDownCapture={(event) => {
        touch();
        copyOnKey(event);
      }}
      sx={{ height: props.height ?? 'calc(100dvh - 204px)', minHeight: 380, bgcolor: 'background.paper' }}
    >
      <DataGrid<Row>
        aria-label={props.label}
        columns={props.columns}
        rows={props.rows ?? []}
        getRowId={props.getRowId}
        loading={props.loading}
        rowHeight={props.rowHeight ?? 32}
        columnHeaderHeight={34}
        density="standard"
        rowCount={rowCount}
        paginationMode="server"
        sortingMode="server"
        filterMode="server"
        paginationModel={paginationModel}
        pageSizeOptions={[25, 50, 100]}
        onPaginationModelChange={({ page, pageSize }) => {
          if (props.total !== undefined && (touched.current || beyond))
            state.setPage(pageSize === state.size ? page + 1 : 1, pageSize);
        }}
        sortModel={sortModel}
        onSortModelChange={([key]) => {
          const second = state.sort[1];
          const main = key ? [{ field: key.field, down: key.sort === 'desc' }] : [];
          state.setSort(second && key && second.field !== key.field ? [...main, second] : main);
        }}
        columnVisibilityModel={props.hidden ?? {}}
        disableColumnFilter
        disableColumnMenu
        disableRowSelectionOnClick
        apiRef={grid}
        checkboxSelection={!narrow}
        rowSelectionModel={selection}
        onRowSelectionModelChange={setSelection}
        onRowClick={({ row }) => props.onOpen(row as Row)}
        onCellKeyDown={({ row, field }, event) => {
          if (event.key === 'Enter' && field !== '__check__') props.onOpen(row as Row);
        }}
        slots={{ noRowsOverlay: EmptyOverlay, noResultsOverlay: EmptyOverlay, footer: SelectableFooter }}
        slotProps={{
          footer: { count: chosen.length, onCopy: () => void copy(), onClear: () => setSelection(NONE) },
          noRowsOverlay: { children: props.empty },
          loadingOverlay: { variant: 'skeleton', noRowsVariant: 'skeleton' },
        }}
      />
    </Box>
  );
}

/** The grid's own overlay centres one short line; ours says what to do next. */
function EmptyOverlay({ children }: { children?: ReactNode }) {
  return <Box sx={{ position: 'relative', zIndex: 1, whiteSpace: 'normal' }}>{children}</Box>;
}

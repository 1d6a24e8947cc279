import Box from '@mui/material/Box';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import type { StockItem } from '../../api/types';
import { formatDay, NOTHING } from '../../components/figures';
import type { CopiedCell, DataColumn } from '../../components/gridText';
import { placesWords, quantityWords, shortWords } from '../../components/stock/stockWords';

type Column = DataColumn<StockItem>;

/** Bold and in words, too: the colour alone tells nothing. */
function Low({ children }: { children: ReactNode }) {
  return (
    <Box component="b" sx={{ color: 'error.main', fontWeight: 600 }}>
      {children}
    </Box>
  );
}

const TWO_LINES = {
  display: '-webkit-box',
  WebkitBoxOrient: 'vertical',
  WebkitLineClamp: 2,
  overflow: 'hidden',
  whiteSpace: 'normal',
  lineHeight: 1.3,
} as const;

const figure = (field: string, headerName: string, width: number): Column => ({
  field,
  headerName,
  width,
  align: 'right',
  headerAlign: 'right',
});

const COLUMNS: Column[] = [
  {
    field: 'number',
    headerName: 'Number',
    width: 104,
    renderCell: ({ row }) => (
      <Link
        to={`/parts/${encodeURIComponent(row.number)}`}
        className="part-number"
        tabIndex={-1}
        style={{ color: 'inherit', textDecoration: 'none' }}
      >
        {row.number}
      </Link>
    ),
  },
  {
    field: 'description',
    headerName: 'Description',
    flex: 1.2,
    minWidth: 200,
    renderCell: ({ row }) => <span title={row.description}>{row.description}</span>,
  },
  {
    ...figure('quantity', 'On shelf', 96),
    copied: ({ quantity }) => quantity,
    valueGetter: (_, { quantity, unit }) => quantityWords(quantity, unit),
  },
  {
    ...figure('leastStock', 'Least', 90),
    valueGetter: (_, { leastStock, unit }) =>
      leastStock === null ? NOTHING : quantityWords(leastStock, unit),
  },
  {
    ...figure('shortBy', 'Short by', 92),
    valueGetter: (_, item) => shortWords(item),
    renderCell: ({ row }) => (row.low ? <Low>{shortWords(row)}</Low> : NOTHING),
  },
  {
    field: 'places',
    headerName: 'Places',
    flex: 1,
    minWidth: 150,
    sortable: false,
    valueGetter: (_, item) => placesWords(item),
    renderCell: ({ row }) => <span title={placesWords(row)}>{placesWords(row)}</span>,
  },
  {
    field: 'countedAt',
    headerName: 'Counted',
    width: 104,
    sortable: false,
    align: 'right',
    headerAlign: 'right',
    valueGetter: (_, item) => lastCounted(item),
  },
];

export const MIDDLE_HIDDEN = { countedAt: false };
export const NARROW_HIDDEN = {
  ...MIDDLE_HIDDEN,
  leastStock: false,
  shortBy: false,
  places: false,
};

/** On a phone the description takes two lines, and the figure carries the unit and the word that it is low. */
export function shelfColumns(narrow: boolean): Column[] {
  if (!narrow) return COLUMNS;
  return COLUMNS.map((column) => {
    if (column.field === 'number') return { ...column, width: 92 };
    if (column.field === 'description') {
      const renderCell: Column['renderCell'] = ({ row }) => <span style={TWO_LINES}>{row.description}</span>;
      return { ...column, minWidth: 100, display: 'flex', renderCell };
    }
    if (column.field === 'quantity') {
      const renderCell: Column['renderCell'] = ({ row }) => (
        <span>
          {quantityWords(row.quantity, row.unit)} {row.low && <Low>low</Low>}
        </span>
      );
      return { ...column, width: 104, renderCell };
    }
    return column;
  });
}

export const COPY_HEAD = [
  'Number',
  'Description',
  'On shelf',
  'Unit',
  'Least',
  'Short by',
  'Places',
  'Counted',
];

/** A copied figure keeps a plain point, so that a spreadsheet reads it as a number. */
export function copyRow(item: StockItem): CopiedCell[] {
  const { number, description, quantity, unit, leastStock, low } = item;
  const short = low && leastStock !== null ? Number((leastStock - quantity).toFixed(3)) : null;
  return [number, description, quantity, unit, leastStock, short, placesWords(item), lastCounted(item)];
}

/** The latest count at any place. */
function lastCounted({ places }: StockItem): string {
  const latest = places.reduce<string>(
    (last, { countedAt }) => (countedAt !== null && countedAt > last ? countedAt : last),
    '',
  );
  return latest === '' ? NOTHING : formatDay(latest);
}

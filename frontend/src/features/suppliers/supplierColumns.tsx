import Box from '@mui/material/Box';
import type { Supplier } from '../../api/types';
import { formatDay, NOTHING } from '../../components/figures';
import type { DataColumn } from '../../components/gridText';
import { moneyWords } from '../../components/moneyText';
import { leadTimeWords } from '../../components/offers/offerWords';
import { freightWords, offersWords } from './supplierWords';

const ONE_LINE = { overflow: 'hidden', textOverflow: 'ellipsis' } as const;

const right = { align: 'right', headerAlign: 'right' } as const;

/** Columns of the list; `sortable` ones are those that the server sorts by. */
const SUPPLIER_COLUMNS: DataColumn<Supplier>[] = [
  { field: 'code', headerName: 'Code', width: 80, cellClassName: 'part-number' },
  {
    field: 'name',
    headerName: 'Name',
    flex: 1,
    minWidth: 222,
    valueGetter: (_, { name, standing }) => (standing === 'closed' ? `${name} (closed)` : name),
    renderCell: ({ value }) => <span title={String(value)}>{String(value)}</span>,
  },
  { field: 'currency', headerName: 'Currency', width: 86 },
  {
    field: 'leadTimeDays',
    headerName: 'Lead time',
    description: 'Their usual lead time',
    width: 96,
    ...right,
    valueFormatter: (days: number | null) => leadTimeWords(days),
  },
  {
    field: 'leastOrderValue',
    headerName: 'Least order',
    width: 108,
    sortable: false,
    ...right,
    valueGetter: (_, { leastOrderValue, currency }) =>
      leastOrderValue === null ? 'none' : moneyWords(leastOrderValue, currency),
  },
  {
    field: 'freight',
    headerName: 'Freight',
    flex: 1,
    minWidth: 236,
    sortable: false,
    valueGetter: (_, { freight, currency }) => freightWords(freight, currency),
    renderCell: ({ value }) => <span title={String(value)}>{String(value)}</span>,
  },
  {
    field: 'offers',
    headerName: 'Offers',
    width: 168,
    ...right,
    valueGetter: (_, { offers }) => offersWords(offers),
  },
  {
    field: 'oldestPrice',
    headerName: 'Oldest price',
    width: 104,
    sortable: false,
    ...right,
    valueGetter: (_, { offers: { oldestPricedOn } }) =>
      oldestPricedOn === null ? NOTHING : formatDay(oldestPricedOn),
  },
  {
    field: 'updatedAt',
    headerName: 'Changed',
    width: 108,
    ...right,
    valueFormatter: (iso: string) => formatDay(iso),
  },
];

/** Left out where the screen is a laptop's: everything else then stands whole. */
export const LAPTOP_HIDDEN = { leastOrderValue: false, updatedAt: false };

/** Left out below the widest screens. */
export const WIDE_HIDDEN = { updatedAt: false };

/** Left out where the screen is a phone's. */
export const NARROW_HIDDEN = {
  ...LAPTOP_HIDDEN,
  currency: false,
  leadTimeDays: false,
  freight: false,
  offers: false,
  oldestPrice: false,
};

/** On a phone the offers stand under the name. */
export function supplierColumns(narrow: boolean): DataColumn<Supplier>[] {
  if (!narrow) return SUPPLIER_COLUMNS;
  return SUPPLIER_COLUMNS.map((column) => {
    if (column.field !== 'name') return column;
    const renderCell: DataColumn<Supplier>['renderCell'] = ({ row, value }) => (
      <Box sx={{ lineHeight: 1.35, minWidth: 0 }}>
        <Box sx={ONE_LINE}>{String(value)}</Box>
        <Box sx={{ ...ONE_LINE, color: 'text.secondary', fontSize: '0.75rem' }}>
          {`${row.currency} · ${row.offers.open + row.offers.expired === 0 ? 'no offers' : offersWords(row.offers)}`}
        </Box>
      </Box>
    );
    return { ...column, display: 'flex', renderCell };
  });
}

import type { Supplier } from '../../api/types';
import { formatDay, NOTHING } from '../../components/figures';
import type { DataColumn } from '../../components/gridText';
import { moneyWords } from '../../components/moneyText';
import { leadTimeWords } from '../../components/offers/offerWords';
import { freightWords, offersWords } from './supplierWords';

const right = { align: 'right', headerAlign: 'right' } as const;

/** Columns of the list; `sortable` ones are those that the server sorts by. */
export const SUPPLIER_COLUMNS: DataColumn<Supplier>[] = [
  { field: 'code', headerName: 'Code', width: 84, cellClassName: 'part-number' },
  {
    field: 'name',
    headerName: 'Name',
    flex: 1,
    minWidth: 180,
    valueGetter: (_, { name, standing }) => (standing === 'closed' ? `${name} (closed)` : name),
    renderCell: ({ value }) => <span title={String(value)}>{String(value)}</span>,
  },
  { field: 'currency', headerName: 'Currency', width: 88 },
  {
    field: 'leadTimeDays',
    headerName: 'Usual lead time',
    width: 124,
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
    flex: 1.3,
    minWidth: 190,
    sortable: false,
    valueGetter: (_, { freight, currency }) => freightWords(freight, currency),
    renderCell: ({ value }) => <span title={String(value)}>{String(value)}</span>,
  },
  {
    field: 'offers',
    headerName: 'Offers',
    width: 172,
    ...right,
    valueGetter: (_, { offers }) => offersWords(offers),
  },
  {
    field: 'oldestPrice',
    headerName: 'Oldest price',
    width: 110,
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
  oldestPrice: false,
};

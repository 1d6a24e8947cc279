import Box from '@mui/material/Box';
import type { Offer } from '../../api/types';
import type { DataColumn } from '../gridText';
import { breaksWords, leadTimeWords, validityWords } from './offerWords';
import { OfferStateWord } from './OfferStateWord';
import { PriceAge } from './PriceAge';

type Column = DataColumn<Offer>;

/** Columns of every list of offers; `sortable` ones are those that the server sorts by. */
const COLUMNS: Column[] = [
  {
    field: 'part',
    headerName: 'Part',
    width: 92,
    cellClassName: 'part-number',
    valueGetter: (_, { part }) => part.number,
  },
  {
    field: 'description',
    headerName: 'Description',
    flex: 1,
    minWidth: 150,
    sortable: false,
    valueGetter: (_, { part }) => part.description,
    renderCell: ({ value }) => <span title={String(value)}>{String(value)}</span>,
  },
  {
    field: 'supplier',
    headerName: 'Supplier',
    flex: 1,
    minWidth: 150,
    maxWidth: 220,
    valueGetter: (_, { supplier }) => supplier.name,
    renderCell: ({ value }) => <span title={String(value)}>{String(value)}</span>,
  },
  { field: 'supplierPartNumber', headerName: 'Their number', width: 130, cellClassName: 'part-number' },
  {
    field: 'breaks',
    headerName: 'Price from a quantity',
    flex: 0.3,
    minWidth: 290,
    sortable: false,
    valueGetter: (_, offer) => breaksWords(offer),
    renderCell: ({ value }) => <span title={String(value)}>{String(value)}</span>,
  },
  {
    field: 'leadTimeDays',
    headerName: 'Lead time',
    width: 86,
    align: 'right',
    headerAlign: 'right',
    valueGetter: (_, { effectiveLeadTimeDays }) => leadTimeWords(effectiveLeadTimeDays),
  },
  {
    field: 'state',
    headerName: 'State',
    width: 92,
    sortable: false,
    renderCell: ({ row }) => <OfferStateWord state={row.state} />,
  },
  {
    field: 'pricedOn',
    headerName: 'Price age',
    width: 130,
    renderCell: ({ row }) => <PriceAge offer={row} short />,
    copied: ({ pricedOn }) => pricedOn,
  },
  {
    field: 'validUntil',
    headerName: 'Holds',
    width: 166,
    valueGetter: (_, offer) => validityWords(offer),
    renderCell: ({ row, value }) => <OfferStateWord state={row.state} words={String(value)} />,
  },
];

/** How much of a table a screen has room for. */
export type OffersRoom = 'narrow' | 'laptop' | 'wide' | 'full';

/** Columns to leave out: what does not fit, and the supplier where all rows are one supplier's. */
export function hiddenOfferColumns(room: OffersRoom, ofOneSupplier: boolean): Record<string, boolean> {
  return {
    supplier: !ofOneSupplier && room !== 'narrow',
    supplierPartNumber: room === 'full' || (ofOneSupplier && room !== 'narrow'),
    // How long it holds says its state too; where there is no room for that, the state alone.
    ...(room === 'wide' || room === 'full' ? { state: false } : { validUntil: false }),
    ...(room === 'narrow' ? { description: false, leadTimeDays: false, state: false, pricedOn: false } : {}),
  };
}

const STACKED = {
  lineHeight: 1.3,
  height: '100%',
  display: 'grid',
  alignContent: 'center',
  whiteSpace: 'normal',
} as const;

const SMALL = { color: 'text.secondary', fontSize: '0.75rem', fontWeight: 400 } as const;

/** On a phone a row has two lines: the part over who offers it, the prices over whether they hold. */
export function offerColumnsFor(room: OffersRoom, ofOneSupplier: boolean): Column[] {
  if (room !== 'narrow') return COLUMNS;
  return COLUMNS.map((column) => {
    if (column.field === 'part') {
      const renderCell: Column['renderCell'] = ({ row }) => (
        <Box sx={STACKED}>
          <span className="part-number">{row.part.number}</span>
          <Box component="span" sx={{ ...SMALL, maxHeight: '2.6em', overflow: 'hidden' }}>
            {ofOneSupplier ? row.part.description : row.supplier.name}
          </Box>
        </Box>
      );
      return { ...column, width: 136, renderCell };
    }
    if (column.field === 'breaks') {
      const renderCell: Column['renderCell'] = ({ row }) => (
        <Box sx={STACKED}>
          <Box component="span" sx={{ maxHeight: '2.6em', overflow: 'hidden' }}>
            {breaksWords(row)}
          </Box>
          <Box component="span" sx={SMALL}>
            <OfferStateWord state={row.state} />, <PriceAge offer={row} />
          </Box>
        </Box>
      );
      return { ...column, minWidth: 150, renderCell };
    }
    return column;
  });
}

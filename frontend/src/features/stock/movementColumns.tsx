import { Link } from 'react-router-dom';
import type { Movement } from '../../api/types';
import { formatDay, formatWhen } from '../../components/figures';
import type { CopiedCell, DataColumn } from '../../components/gridText';
import { changeWords, figureWords } from '../../components/stock/stockWords';

type Column = DataColumn<Movement>;

const PartLink = ({ number }: { number: string }) => (
  <Link
    to={`/parts/${encodeURIComponent(number)}`}
    className="part-number"
    tabIndex={-1}
    style={{ color: 'inherit', textDecoration: 'none' }}
  >
    {number}
  </Link>
);

const ONE_LINE = { display: 'block', overflow: 'hidden', textOverflow: 'ellipsis' } as const;

const titled = (text: string) => <span title={text}>{text}</span>;

const COLUMNS: Column[] = [
  { field: 'at', headerName: 'When', width: 150, valueFormatter: (at: string) => formatWhen(at) },
  {
    field: 'number',
    headerName: 'Part',
    width: 94,
    sortable: false,
    renderCell: ({ row }) => <PartLink number={row.number} />,
  },
  {
    field: 'description',
    headerName: 'Description',
    flex: 1,
    minWidth: 150,
    sortable: false,
    renderCell: ({ row }) => titled(row.description),
  },
  { field: 'kind', headerName: 'What', width: 88, sortable: false },
  {
    field: 'change',
    headerName: 'Change',
    width: 92,
    sortable: false,
    align: 'right',
    headerAlign: 'right',
    valueGetter: (_, { change, unit }) => `${changeWords(change)} ${unit}`,
  },
  {
    field: 'after',
    headerName: 'Then there',
    width: 96,
    sortable: false,
    align: 'right',
    headerAlign: 'right',
    valueFormatter: (after: number) => figureWords(after),
  },
  {
    field: 'place',
    headerName: 'Place',
    width: 158,
    sortable: false,
    renderCell: ({ row }) => titled(row.place),
  },
  {
    field: 'reason',
    headerName: 'Why',
    flex: 1.2,
    minWidth: 150,
    sortable: false,
    renderCell: ({ row }) => titled(row.reason),
  },
  { field: 'by', headerName: 'By', width: 104, sortable: false },
];

export const MIDDLE_HIDDEN = { after: false };
export const NARROW_HIDDEN = {
  ...MIDDLE_HIDDEN,
  number: false,
  description: false,
  kind: false,
  place: false,
  reason: false,
  by: false,
};

/** On a phone each row says in two lines what was done, and when. */
export function movementColumns(narrow: boolean): Column[] {
  if (!narrow) return COLUMNS;
  return COLUMNS.map((column) => {
    if (column.field !== 'at') return column;
    return {
      ...column,
      headerName: 'Movement',
      flex: 1,
      minWidth: 200,
      display: 'flex',
      renderCell: ({ row }) => (
        <span style={{ lineHeight: 1.4, minWidth: 0 }}>
          <span style={ONE_LINE}>
            <PartLink number={row.number} /> {row.kind} {formatDay(row.at)}
          </span>
          <span style={ONE_LINE}>
            {row.place} · {row.by}
          </span>
        </span>
      ),
    };
  });
}

export const COPY_HEAD = [
  'When',
  'Part',
  'Description',
  'What',
  'Change',
  'Counted',
  'Then there',
  'Unit',
  'Place',
  'Why',
  'By',
];

/** A copied figure keeps a plain point and minus, so that a spreadsheet reads it as a number. */
export function copyRow(movement: Movement): CopiedCell[] {
  const { at, number, description, kind, change, counted, after, unit, place, reason, by } = movement;
  return [at, number, description, kind, change, counted, after, unit, place, reason, by];
}

import type { GridColDef } from '@mui/x-data-grid';
import { Link } from 'react-router-dom';
import type { PartSummary } from '../../api/types';
import { formatDay, formatFixed, formatMass, formatPlain, NOTHING } from '../../components/figures';
import { attributeOf, figureOf } from './attributes';
import { KIND_NAMES } from './partKinds';
import { StandingWord } from './StandingWord';

type Column = GridColDef<PartSummary>;

/** A figure of the attributes, right-aligned; its unit stands in the head. */
function attributeColumn(field: string, headerName: string, width: number, sortable = true): Column {
  return {
    field,
    headerName,
    width,
    sortable,
    align: 'right',
    headerAlign: 'right',
    valueGetter: (_, part) => figureOf(part, field),
    valueFormatter: (value: number | null) => formatPlain(value),
  };
}

/** Columns of the library; `sortable` ones are those that the server sorts by. */
export const PART_COLUMNS: Column[] = [
  {
    field: 'number',
    headerName: 'Number',
    width: 100,
    renderCell: ({ row }) => (
      <Link
        to={`/parts/${encodeURIComponent(row.number)}`}
        className="part-number"
        tabIndex={-1}
        style={{ color: 'inherit', textDecoration: 'none' }}
      >
        {row.number}
        {row.standing === 'withdrawn' && <span title="withdrawn"> ✕</span>}
      </Link>
    ),
  },
  {
    field: 'description',
    headerName: 'Description',
    flex: 1,
    minWidth: 210,
    // What does not fit can be read in full by pointing at it.
    renderCell: ({ row }) => <span title={row.description}>{row.description}</span>,
  },
  {
    field: 'kind',
    headerName: 'Kind',
    width: 112,
    valueFormatter: (kind: PartSummary['kind']) => KIND_NAMES[kind],
  },
  attributeColumn('teeth', 'Teeth', 76),
  attributeColumn('module', 'Module mm', 112),
  {
    ...attributeColumn('helixAngleDeg', 'Helix', 84, false),
    valueGetter: (_, part) => {
      const angle = figureOf(part, 'helixAngleDeg');
      if (angle === null) return '';
      const hand = attributeOf(part, 'hand');
      return angle === 0 ? 'spur' : `${formatPlain(angle)}° ${typeof hand === 'string' ? hand : ''}`;
    },
    valueFormatter: undefined,
  },
  {
    ...attributeColumn('profileShift', 'Shift x', 76, false),
    valueGetter: (_, part) => (figureOf(part, 'teeth') === null ? null : figureOf(part, 'profileShift')),
    valueFormatter: (value: number | null) => (value === null ? NOTHING : formatFixed(value, 3)),
  },
  attributeColumn('faceWidth', 'Face mm', 88),
  attributeColumn('bore', 'Bore mm', 88),
  {
    field: 'material',
    headerName: 'Material',
    width: 106,
    sortable: false,
    valueFormatter: (value: string | null) => value ?? NOTHING,
  },
  {
    field: 'mass',
    headerName: 'Mass kg',
    width: 92,
    align: 'right',
    headerAlign: 'right',
    valueFormatter: (value: number | null) => formatMass(value),
  },
  {
    field: 'shelf',
    headerName: 'Shelf',
    width: 68,
    sortable: false,
    align: 'right',
    headerAlign: 'right',
    renderCell: ({ row: { shelf, leastStock, unit } }) => {
      if (shelf === null && leastStock === null) return NOTHING;
      const low = leastStock !== null && (shelf ?? 0) < leastStock;
      return (
        <span title={low ? `low: the least is ${formatPlain(leastStock, 3)} ${unit}` : undefined}>
          {low && <b>low </b>}
          {formatPlain(shelf ?? 0, 3)}
          {unit === 'l' && ' l'}
        </span>
      );
    },
  },
  {
    field: 'standing',
    headerName: 'Standing',
    width: 104,
    renderCell: ({ row }) => <StandingWord standing={row.standing} />,
  },
  {
    field: 'updatedAt',
    headerName: 'Changed',
    width: 100,
    align: 'right',
    headerAlign: 'right',
    valueFormatter: (value: string) => formatDay(value),
  },
];

/** How much of a table a screen has room for. */
export type TableWidth = 'narrow' | 'middle' | 'wide' | 'full';

/** The least room in which a column shows; columns not named here show from `middle` on. */
const ROOM: Partial<Record<string, readonly TableWidth[]>> = {
  number: ['narrow', 'middle', 'wide', 'full'],
  description: ['narrow', 'middle', 'wide', 'full'],
  // The description says the kind first; its filter is always there.
  kind: ['full'],
  teeth: ['narrow', 'middle', 'wide', 'full'],
  material: ['wide', 'full'],
  mass: ['full'],
  profileShift: ['full'],
  updatedAt: ['full'],
};

const FROM_MIDDLE: readonly TableWidth[] = ['middle', 'wide', 'full'];

export function hiddenColumns(width: TableWidth): Record<string, boolean> {
  return Object.fromEntries(
    PART_COLUMNS.map(({ field }) => [field, (ROOM[field] ?? FROM_MIDDLE).includes(width)]),
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

/** On a narrow screen the columns draw closer, and the standing moves into the number. */
export function columnsFor(width: TableWidth): Column[] {
  if (width !== 'narrow') return PART_COLUMNS;
  return PART_COLUMNS.map((column) => {
    if (column.field === 'description') {
      // Two lines instead of one cut short.
      const renderCell: Column['renderCell'] = ({ row }) => <span style={TWO_LINES}>{row.description}</span>;
      return { ...column, minWidth: 100, display: 'flex', renderCell };
    }
    if (column.field === 'number') return { ...column, width: 92 };
    if (column.field === 'teeth') return { ...column, width: 62 };
    return column;
  });
}

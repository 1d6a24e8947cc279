import type { GridColDef } from '@mui/x-data-grid';
import { Link } from 'react-router-dom';
import type { PartSummary } from '../../api/types';
import { formatDay, formatFixed, formatPlain, NOTHING } from '../../components/figures';
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
  { field: 'description', headerName: 'Description', flex: 1, minWidth: 210 },
  {
    field: 'kind',
    headerName: 'Kind',
    width: 112,
    valueFormatter: (kind: PartSummary['kind']) => KIND_NAMES[kind],
  },
  attributeColumn('teeth', 'Teeth', 62),
  attributeColumn('module', 'Module mm', 92),
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
    ...attributeColumn('profileShift', 'Shift x', 68, false),
    valueGetter: (_, part) => (figureOf(part, 'teeth') === null ? null : figureOf(part, 'profileShift')),
    valueFormatter: (value: number | null) => (value === null ? NOTHING : formatFixed(value, 3)),
  },
  attributeColumn('faceWidth', 'Face mm', 78),
  attributeColumn('bore', 'Bore mm', 78),
  {
    field: 'material',
    headerName: 'Material',
    width: 120,
    sortable: false,
    valueFormatter: (value: string | null) => value ?? NOTHING,
  },
  {
    field: 'mass',
    headerName: 'Mass kg',
    width: 80,
    align: 'right',
    headerAlign: 'right',
    valueFormatter: (value: number | null) => formatFixed(value, 3),
  },
  {
    field: 'standing',
    headerName: 'Standing',
    width: 98,
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

/** Shown beside the number on a narrow screen. */
const NARROW = new Set(['number', 'description', 'teeth', 'module', 'standing']);
/** Left out where a laptop's width would cramp the rest. */
const WIDE_ONLY = new Set(['updatedAt', 'profileShift', 'mass']);

export function hiddenColumns(width: 'narrow' | 'middle' | 'wide'): Record<string, boolean> {
  return Object.fromEntries(
    PART_COLUMNS.map(({ field }) => [
      field,
      width === 'wide' || (width === 'middle' ? !WIDE_ONLY.has(field) : NARROW.has(field)),
    ]),
  );
}

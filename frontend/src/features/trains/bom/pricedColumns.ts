/** How much of the table a screen has room for: `always`, from a tablet on, from a laptop on. */
type Room = 'always' | 'tablet' | 'laptop';

export interface PricedColumn {
  name: string;
  /** Said by a screen reader where the head shows nothing. */
  said?: string;
  figure?: boolean;
  room: Room;
  /** px on a screen; left out: what is left. */
  width?: number;
  /** Where a phone gives it another width. */
  phoneWidth?: number;
  /** Per cent of the printed sheet; left out: not printed. */
  paper?: number;
}

export const COLUMNS: PricedColumn[] = [
  { name: 'Find', figure: true, room: 'always', width: 42, phoneWidth: 38, paper: 5 },
  { name: 'Part', room: 'tablet', width: 90, paper: 11 },
  { name: 'Description', room: 'always', paper: 27 },
  { name: 'Needed', figure: true, room: 'tablet', width: 66, paper: 9 },
  { name: 'Shelf', figure: true, room: 'tablet', width: 56, paper: 7 },
  { name: 'Supplier', room: 'tablet', width: 138, paper: 15 },
  { name: 'Order', figure: true, room: 'laptop', width: 66, paper: 8 },
  { name: 'Unit price', figure: true, room: 'laptop', width: 98 },
  { name: 'Line total', figure: true, room: 'always', width: 94, phoneWidth: 96, paper: 13 },
  { name: 'Lead', figure: true, room: 'tablet', width: 52, paper: 5 },
  { name: 'Price age', room: 'laptop', width: 108 },
  { name: '', said: 'Actions', room: 'always', width: 32, phoneWidth: 30 },
];

const DISPLAY: Record<Room, object> = {
  always: {},
  tablet: { display: { xs: 'none', md: 'table-cell' } },
  laptop: { display: { xs: 'none', lg: 'table-cell' } },
};

/** Where a column shows, how wide it is, and the same on paper. */
export function columnSx({ room, width, phoneWidth, paper }: Omit<PricedColumn, 'name'>): object {
  return {
    ...DISPLAY[room],
    ...(width === undefined ? {} : { width: { xs: phoneWidth ?? width, md: width } }),
    '@media print':
      paper === undefined ? { display: 'none' } : { display: 'table-cell', width: `${paper}% !important` },
  };
}

/** Where the cells of a column show; for the rows. */
export const cellSx = (name: string): object => {
  const column = COLUMNS.find((each) => (each.said ?? each.name) === name);
  if (!column) throw new Error(`There is no column ${name}.`);
  const { room, paper } = column;
  return columnSx({ room, paper });
};

/** Only on a phone: what the columns left out there say. */
export const PHONE_ONLY = { display: { xs: 'block', md: 'none' }, displayPrint: 'none' } as const;
/** Not on a phone, where it stands elsewhere. */
export const NOT_ON_PHONE = { display: { xs: 'none', md: 'inline' } } as const;

export const tableSx = {
  tableLayout: 'fixed',
  '& .MuiTableCell-root': {
    px: 0.75,
    py: 0.375,
    fontSize: '0.8125rem',
    whiteSpace: 'nowrap',
    overflow: 'hidden',
    textOverflow: 'ellipsis',
  },
  '& thead .MuiTableCell-root': { fontSize: '0.75rem', height: 28 },
  '& tbody tr': { height: 30, outlineOffset: '-2px' },
  '& tbody tr[aria-selected="true"], & tbody tr[aria-selected="true"]:hover': { bgcolor: 'wash.brass' },
  '@media print': {
    '& .MuiTableCell-root': { px: 0.5, fontSize: '0.6875rem', whiteSpace: 'normal' },
    '& tr': { breakInside: 'avoid', height: 'auto' },
  },
} as const;

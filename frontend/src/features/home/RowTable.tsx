import TableBody from '@mui/material/TableBody';
import TableCell from '@mui/material/TableCell';
import TableContainer from '@mui/material/TableContainer';
import TableHead from '@mui/material/TableHead';
import TableRow from '@mui/material/TableRow';
import type { ReactNode } from 'react';
import { useNavigate } from 'react-router-dom';
import { CopyTable } from '../../components/CopyTable';

export interface RowColumn<Row> {
  name: string;
  figure?: boolean;
  /** Left out on a narrow screen. */
  wideOnly?: boolean;
  /** Stands on a narrow screen in place of what is left out there. */
  phoneOnly?: boolean;
  cell: (row: Row) => ReactNode;
}

interface RowTableProps<Row> {
  label: string;
  columns: readonly RowColumn<Row>[];
  rows: readonly Row[];
  keyOf: (row: Row) => string;
  /** Where a click on the row goes; the row's first cell holds the link that a keyboard reaches. */
  pathOf: (row: Row) => string;
}

/** A short list on the first page; the whole row leads on. */
export function RowTable<Row>({ label, columns, rows, keyOf, pathOf }: RowTableProps<Row>) {
  const navigate = useNavigate();
  const wide = (column: RowColumn<Row>) => ({
    ...(column.figure ? { whiteSpace: 'nowrap' } : {}),
    ...(column.wideOnly ? { display: { xs: 'none', sm: 'table-cell' } } : {}),
    ...(column.phoneOnly ? { display: { sm: 'none' } } : {}),
  });
  return (
    <TableContainer>
      <CopyTable label={label} opens>
        <TableHead>
          <TableRow>
            {columns.map((column) => (
              <TableCell key={column.name} align={column.figure ? 'right' : 'left'} sx={wide(column)}>
                {column.name}
              </TableCell>
            ))}
          </TableRow>
        </TableHead>
        <TableBody>
          {rows.map((row) => (
            <TableRow
              key={keyOf(row)}
              hover
              onClick={({ target }) => {
                // A link in the row goes its own way.
                if (!(target instanceof Element && target.closest('a'))) void navigate(pathOf(row));
              }}
              sx={{ cursor: 'pointer', '&:last-of-type > *': { borderBottom: 0 } }}
            >
              {columns.map((column) => (
                <TableCell key={column.name} align={column.figure ? 'right' : 'left'} sx={wide(column)}>
                  {column.cell(row)}
                </TableCell>
              ))}
            </TableRow>
          ))}
        </TableBody>
      </CopyTable>
    </TableContainer>
  );
}

import Box from '@mui/material/Box';
import TableBody from '@mui/material/TableBody';
import TableCell from '@mui/material/TableCell';
import TableContainer from '@mui/material/TableContainer';
import TableHead from '@mui/material/TableHead';
import TableRow from '@mui/material/TableRow';
import type { ReactNode } from 'react';
import { CopyTable } from './CopyTable';

export interface FigureRow {
  label: ReactNode;
  /** Unit of every figure in the row; stands after the label. */
  unit?: string;
  values: ReactNode[];
  /** Under the label, smaller: a limit or a reason. */
  note?: ReactNode;
}

interface FigureTableProps {
  /** Names the table for a screen reader; shown when `head` has no first name. */
  label: string;
  /** Head of the first column, then of each value column; leave out for a two-column list of facts. */
  head?: ReactNode[];
  rows: FigureRow[];
}

/** Figures right-aligned in tabular numerals, each with its unit beside the label. */
export function FigureTable({ label, head, rows }: FigureTableProps) {
  return (
    <TableContainer>
      <CopyTable label={label}>
        {head !== undefined && (
          <TableHead>
            <TableRow>
              {head.map((name, column) => (
                <TableCell key={column} align={column === 0 ? 'left' : 'right'} scope="col">
                  {name}
                </TableCell>
              ))}
            </TableRow>
          </TableHead>
        )}
        <TableBody>
          {rows.map((row, index) => (
            <TableRow key={index} sx={{ '&:last-of-type > *': { borderBottom: 0 } }}>
              <TableCell component="th" scope="row" sx={{ fontWeight: 400 }}>
                {row.label}
                {row.unit !== undefined && (
                  <Box component="span" sx={{ color: 'text.secondary' }}>
                    {`, ${row.unit}`}
                  </Box>
                )}
                {row.note !== undefined && (
                  <Box sx={{ color: 'text.secondary', fontSize: '0.75rem' }}>{row.note}</Box>
                )}
              </TableCell>
              {row.values.map((value, column) => (
                <TableCell key={column} align="right">
                  {value}
                </TableCell>
              ))}
            </TableRow>
          ))}
        </TableBody>
      </CopyTable>
    </TableContainer>
  );
}

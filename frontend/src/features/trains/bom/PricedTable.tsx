import Box from '@mui/material/Box';
import Table from '@mui/material/Table';
import TableBody from '@mui/material/TableBody';
import TableCell from '@mui/material/TableCell';
import TableHead from '@mui/material/TableHead';
import TableRow from '@mui/material/TableRow';
import type { ReactNode } from 'react';
import { SelectionBar } from '../../../components/SelectionBar';
import { useRowSelection } from '../../../components/useRowSelection';
import { PRICED_HEADS, pricedCells, type PricedLine } from './pricedLine';
import { PricedRow } from './PricedRow';
import { COLUMNS, columnSx, tableSx } from './pricedColumns';

interface PricedTableProps {
  lines: readonly PricedLine[];
  /** The day that prices are held against, ISO 8601; blank until the prices have come. */
  on: string;
  /** What can be done with a line. */
  menuOf: (line: PricedLine) => ReactNode;
  /** Puts the table in its place, with what copies it. */
  frame: (table: ReactNode, copy: () => void) => ReactNode;
}

/** The bill of materials with what every line costs, from whom, and when it comes: one line a row. */
export function PricedTable({ lines, on, menuOf, frame }: PricedTableProps) {
  const { body, rowProps, copy, selected, clear } = useRowSelection({
    rows: lines.length,
    allRows: lines.length,
    heads: PRICED_HEADS,
    cellsOf: (row) => (lines[row] ? pricedCells(lines[row], on) : []),
  });
  const table = (
    <Box sx={{ bgcolor: 'background.paper', border: '1px solid', borderColor: 'line.rule', minWidth: 0 }}>
      <Table aria-label="Bill of materials" sx={tableSx}>
        <TableHead>
          <TableRow>
            {COLUMNS.map(({ name, said, figure, ...column }) => (
              <TableCell
                key={said ?? name}
                scope="col"
                align={figure ? 'right' : 'left'}
                aria-label={name === '' ? said : undefined}
                sx={columnSx(column)}
              >
                {name}
              </TableCell>
            ))}
          </TableRow>
        </TableHead>
        <TableBody ref={body}>
          {lines.map((line, row) => (
            <PricedRow key={line.line.key} line={line} on={on} menu={menuOf(line)} rowProps={rowProps(row)} />
          ))}
        </TableBody>
      </Table>
    </Box>
  );
  return (
    <>
      {frame(table, () => void copy())}
      <SelectionBar count={selected.size} onCopy={() => void copy()} onClear={clear} />
    </>
  );
}

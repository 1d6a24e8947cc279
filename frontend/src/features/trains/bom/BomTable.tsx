import Box from '@mui/material/Box';
import Table from '@mui/material/Table';
import TableBody from '@mui/material/TableBody';
import TableCell from '@mui/material/TableCell';
import TableHead from '@mui/material/TableHead';
import TableRow from '@mui/material/TableRow';
import WarningAmber from '@mui/icons-material/WarningAmberOutlined';
import type { ReactNode } from 'react';
import type { BomLine } from '../../../api/types';
import { SelectionBar } from '../../../components/SelectionBar';
import { useRowSelection } from '../../../components/useRowSelection';
import { PartLink } from '../PartLink';
import { BOM_HEADS, bomCells, massWords, partNumberWords, quantityWords } from './bomCells';

/** Columns of the printed table, per cent of the sheet's width. */
const PAPER_COLUMNS = [5, 11, 32, 8, 11, 14, 7, 12];

const ON_PAPER = {
  minWidth: 0,
  tableLayout: 'fixed',
  '& td, & th': { px: 0.5, fontSize: '0.6875rem', whiteSpace: 'normal' },
  '& td *': { fontSize: '0.6875rem' },
  '& tr': { breakInside: 'avoid' },
  ...Object.fromEntries(
    PAPER_COLUMNS.map((width, index) => [`& th:nth-of-type(${index + 1})`, { width: `${width}%` }]),
  ),
} as const;

interface BomTableProps {
  lines: readonly BomLine[];
  /** Puts the table in its place, with what copies it. */
  frame: (table: ReactNode, copy: () => void) => ReactNode;
}

/** Lines of a bill of materials without prices; flags stand under the description they concern. */
export function BomTable({ lines, frame }: BomTableProps) {
  const { body, rowProps, copy, selected, clear } = useRowSelection({
    rows: lines.length,
    allRows: lines.length,
    heads: BOM_HEADS,
    cellsOf: (row) => (lines[row] ? bomCells(lines[row]) : []),
  });
  const table = (
    <Box
      sx={{ bgcolor: 'background.paper', overflowX: 'auto' }}
      tabIndex={0}
      role="region"
      aria-label="Bill of materials, scrolls sideways"
    >
      <Table aria-label="Bill of materials" sx={{ minWidth: 860, '@media print': ON_PAPER }}>
        <TableHead>
          <TableRow>
            <TableCell align="right">Find</TableCell>
            <TableCell>Part</TableCell>
            <TableCell sx={{ width: '34%' }}>Description</TableCell>
            <TableCell align="right">Quantity</TableCell>
            <TableCell>Material</TableCell>
            <TableCell>Supply</TableCell>
            <TableCell align="right" sx={{ whiteSpace: 'nowrap' }}>
              Each, kg
            </TableCell>
            <TableCell sx={{ minWidth: 150 }}>Used in</TableCell>
          </TableRow>
        </TableHead>
        <TableBody ref={body}>
          {lines.map((line, row) => (
            <TableRow key={line.key} hover {...rowProps(row)} sx={rowSx}>
              <TableCell align="right">{line.findNumber}</TableCell>
              <TableCell sx={{ whiteSpace: 'nowrap' }}>
                {line.partNumber === null ? (
                  <Box component="span" sx={{ color: 'text.secondary' }}>
                    {partNumberWords(line)}
                  </Box>
                ) : (
                  <PartLink number={line.partNumber} />
                )}
              </TableCell>
              <TableCell>
                {line.description}
                {line.note !== '' && (
                  <Box sx={{ color: 'text.secondary', fontSize: '0.75rem' }}>{line.note}</Box>
                )}
                {line.flags.length > 0 && (
                  <Box sx={{ color: 'warning.main', fontSize: '0.75rem', display: 'flex', gap: 0.5 }}>
                    <WarningAmber
                      titleAccess="Look at this before ordering"
                      sx={{ fontSize: 14, mt: '1px', flexShrink: 0 }}
                    />
                    {line.flags.join(' · ')}
                  </Box>
                )}
              </TableCell>
              <TableCell align="right" sx={{ whiteSpace: 'nowrap' }}>
                {quantityWords(line)}
              </TableCell>
              <TableCell>{line.material ?? '–'}</TableCell>
              <TableCell sx={{ whiteSpace: 'nowrap' }}>
                {line.supply}
                {line.supplier !== null && (
                  <Box sx={{ color: 'text.secondary', fontSize: '0.75rem' }}>{line.supplier}</Box>
                )}
              </TableCell>
              <TableCell align="right">{massWords(line.mass)}</TableCell>
              <TableCell>{line.source.join(', ')}</TableCell>
            </TableRow>
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

const rowSx = {
  verticalAlign: 'top',
  outlineOffset: '-2px',
  '&[aria-selected="true"], &[aria-selected="true"]:hover': { bgcolor: 'wash.brass' },
} as const;

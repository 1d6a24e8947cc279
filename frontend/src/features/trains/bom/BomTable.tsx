import Box from '@mui/material/Box';
import Table from '@mui/material/Table';
import TableBody from '@mui/material/TableBody';
import TableCell from '@mui/material/TableCell';
import TableHead from '@mui/material/TableHead';
import TableRow from '@mui/material/TableRow';
import WarningAmber from '@mui/icons-material/WarningAmberOutlined';
import { Link } from 'react-router-dom';
import type { BomLine } from '../../../api/types';
import { formatFixed } from '../../../components/figures';
import { partNumberWords, quantityWords } from './bomCells';

/** Lines of a bill of materials; flags stand under the description they concern. */
export function BomTable({ lines }: { lines: readonly BomLine[] }) {
  return (
    <Box
      sx={{ bgcolor: 'background.paper', overflowX: 'auto' }}
      tabIndex={0}
      role="region"
      aria-label="Bill of materials, scrolls sideways"
    >
      <Table aria-label="Bill of materials" sx={{ minWidth: 860 }}>
        <TableHead>
          <TableRow>
            <TableCell align="right">Find</TableCell>
            <TableCell>Part</TableCell>
            <TableCell>Description</TableCell>
            <TableCell align="right">Quantity</TableCell>
            <TableCell>Material</TableCell>
            <TableCell>Supply</TableCell>
            <TableCell align="right">Mass each, kg</TableCell>
            <TableCell>Used in</TableCell>
          </TableRow>
        </TableHead>
        <TableBody>
          {lines.map((line) => (
            <TableRow key={line.findNumber} hover sx={{ verticalAlign: 'top' }}>
              <TableCell align="right">{line.findNumber}</TableCell>
              <TableCell sx={{ whiteSpace: 'nowrap' }}>
                {line.partNumber === null ? (
                  <Box component="span" sx={{ color: 'text.secondary' }}>
                    {partNumberWords(line)}
                  </Box>
                ) : (
                  <Link to={`/parts/${encodeURIComponent(line.partNumber)}`} className="part-number">
                    {line.partNumber}
                  </Link>
                )}
              </TableCell>
              <TableCell>
                {line.description}
                {line.note !== '' && (
                  <Box sx={{ color: 'text.secondary', fontSize: '0.75rem' }}>{line.note}</Box>
                )}
                {line.flags.map((flag) => (
                  <Box
                    key={flag}
                    sx={{
                      color: 'warning.main',
                      fontSize: '0.75rem',
                      display: 'flex',
                      gap: 0.5,
                      alignItems: 'center',
                    }}
                  >
                    <WarningAmber titleAccess="Look at this before ordering" sx={{ fontSize: 14 }} />
                    {flag}
                  </Box>
                ))}
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
              <TableCell align="right">{formatFixed(line.mass, 3)}</TableCell>
              <TableCell>{line.source.join(', ')}</TableCell>
            </TableRow>
          ))}
        </TableBody>
      </Table>
    </Box>
  );
}

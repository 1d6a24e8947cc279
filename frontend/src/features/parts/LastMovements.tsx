import Box from '@mui/material/Box';
import TableBody from '@mui/material/TableBody';
import TableCell from '@mui/material/TableCell';
import TableContainer from '@mui/material/TableContainer';
import TableHead from '@mui/material/TableHead';
import TableRow from '@mui/material/TableRow';
import Typography from '@mui/material/Typography';
import { useMemo } from 'react';
import { useMovements } from '../../api/hooks/useMovements';
import { CopyTable } from '../../components/CopyTable';
import { ErrorState } from '../../components/ErrorState';
import { formatWhen } from '../../components/figures';
import { changeWords, figureWords } from '../../components/stock/stockWords';

/** Movements that a part's page shows; the whole ledger is one click away. */
const SHOWN = 5;

const WIDE = { display: { xs: 'none', sm: 'table-cell' } } as const;
/** On a phone they take two lines. */
const ONE_LINE = { whiteSpace: { sm: 'nowrap' } } as const;

/** The latest movements of one part. */
export function LastMovements({ number }: { number: string }) {
  const query = useMemo(() => ({ part: number, size: SHOWN }), [number]);
  const { page, problem, mutate } = useMovements(query);
  if (page === undefined && problem !== null) {
    return <ErrorState problem={problem} onRetry={() => void mutate()} what="the movements" />;
  }
  if (page === undefined || page.items.length === 0) return null;
  return (
    <Box sx={{ mt: 1.5 }}>
      <Typography variant="h3" sx={{ px: 1.25, mb: 0.5 }}>
        Last movements
      </Typography>
      <TableContainer>
        <CopyTable label="Last movements">
          <TableHead>
            <TableRow>
              <TableCell>When</TableCell>
              <TableCell>What</TableCell>
              <TableCell align="right">Change</TableCell>
              <TableCell align="right" sx={{ ...WIDE, ...ONE_LINE }}>
                Then there
              </TableCell>
              <TableCell>Place</TableCell>
              <TableCell sx={WIDE}>Why</TableCell>
              <TableCell sx={WIDE}>By</TableCell>
            </TableRow>
          </TableHead>
          <TableBody>
            {page.items.map((movement) => (
              <TableRow key={movement.id}>
                <TableCell sx={ONE_LINE}>{formatWhen(movement.at)}</TableCell>
                <TableCell>{movement.kind}</TableCell>
                <TableCell align="right">{changeWords(movement.change)}</TableCell>
                <TableCell align="right" sx={WIDE}>
                  {figureWords(movement.after)}
                </TableCell>
                <TableCell sx={ONE_LINE}>{movement.place}</TableCell>
                <TableCell sx={WIDE}>{movement.reason}</TableCell>
                <TableCell sx={{ ...WIDE, ...ONE_LINE }}>{movement.by}</TableCell>
              </TableRow>
            ))}
          </TableBody>
        </CopyTable>
      </TableContainer>
    </Box>
  );
}

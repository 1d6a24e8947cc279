import Box from '@mui/material/Box';
import TableBody from '@mui/material/TableBody';
import TableCell from '@mui/material/TableCell';
import TableHead from '@mui/material/TableHead';
import TableRow from '@mui/material/TableRow';
import Typography from '@mui/material/Typography';
import type { Train } from '../../../api/types';
import { CopyTable } from '../../../components/CopyTable';
import { formatFixed, formatPlain } from '../../../components/figures';
import { VerdictWord } from '../../../components/VerdictWord';

type Check = Train['figures']['checks'][number];

/** Decimals a check's figures are read with, by unit. */
const DECIMALS: Record<string, number> = { mm: 3, '%': 3, '': 3, kg: 3, '′': 1 };

/** Figure and limit with the same decimals, so that they can be read against each other; whole ones stay whole. */
function figureOf({ value, limit, unit }: Check, decimals: number): (figure: number | null) => string {
  const whole = unit !== '' && unit !== '%' && [value, limit].every((each) => Number.isInteger(each));
  return (figure) => (whole ? formatPlain(figure) : formatFixed(figure, decimals));
}

/** Requirements held against the train: figure, limit, verdict in words and by how much. */
export function ChecksTable({ checks }: { checks: readonly Check[] }) {
  if (checks.length === 0) {
    return (
      <Typography variant="body2" color="textSecondary" sx={{ px: 1.75, pb: 1.25 }}>
        Nothing is asked here.
      </Typography>
    );
  }
  return (
    <Box sx={{ overflowX: 'auto' }}>
      <CopyTable label="Checks">
        <TableHead>
          <TableRow>
            <TableCell>Check</TableCell>
            <TableCell align="right">Figure</TableCell>
            <TableCell align="right">Limit</TableCell>
            <TableCell>Verdict</TableCell>
          </TableRow>
        </TableHead>
        <TableBody>
          {checks.map((check, index) => {
            const decimals = DECIMALS[check.unit] ?? 2;
            const figure = figureOf(check, decimals);
            const judged = check.value !== null || check.limit !== null;
            return (
              <TableRow key={`${check.code}-${index}`} sx={{ '&:last-of-type > *': { borderBottom: 0 } }}>
                <TableCell component="th" scope="row" sx={{ fontWeight: 400, minWidth: 130 }}>
                  {check.label}
                  {check.unit && judged && (
                    <Box component="span" sx={{ color: 'text.secondary' }}>{`, ${check.unit}`}</Box>
                  )}
                  {check.verdict !== 'passes' && (
                    <Box sx={{ color: 'text.secondary', fontSize: '0.75rem' }}>{check.message}</Box>
                  )}
                </TableCell>
                <TableCell align="right">{figure(check.value)}</TableCell>
                <TableCell align="right">{figure(check.limit)}</TableCell>
                <TableCell>
                  <VerdictWord
                    verdict={check.verdict}
                    value={check.value}
                    limit={check.limit}
                    unit={check.unit}
                    decimals={decimals}
                  />
                </TableCell>
              </TableRow>
            );
          })}
        </TableBody>
      </CopyTable>
    </Box>
  );
}

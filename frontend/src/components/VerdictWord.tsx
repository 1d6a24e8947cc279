import Cancel from '@mui/icons-material/CancelOutlined';
import Check from '@mui/icons-material/Check';
import Warning from '@mui/icons-material/WarningAmberOutlined';
import Info from '@mui/icons-material/InfoOutlined';
import Box from '@mui/material/Box';
import { formatFixed } from './figures';

export type Verdict = 'passes' | 'marginal' | 'fails' | 'note';

interface VerdictWordProps {
  verdict: Verdict;
  /** With a limit, the word says by how much. */
  value?: number | null;
  limit?: number | null;
  unit?: string;
  decimals?: number;
}

const LOOKS = {
  passes: { icon: Check, color: 'success.main' },
  marginal: { icon: Warning, color: 'warning.main' },
  fails: { icon: Cancel, color: 'error.main' },
  note: { icon: Info, color: 'info.main' },
} as const;

/** "fails by 0.03 mm": the verdict in words and with a sign, so that nothing hangs on colour. */
export function VerdictWord({ verdict, value, limit, unit, decimals = 2 }: VerdictWordProps) {
  const { icon: Icon, color } = LOOKS[verdict];
  const known = value !== undefined && value !== null && limit !== undefined && limit !== null;
  const gap = known ? Math.abs(value - limit) : null;
  const by = gap === null || verdict === 'note' || verdict === 'passes' ? '' : ` by ${amount(gap, decimals)}`;
  const withUnit = by === '' || unit === undefined || unit === '' ? by : `${by} ${unit}`;
  return (
    <Box
      component="span"
      sx={{
        color,
        fontWeight: verdict === 'passes' || verdict === 'note' ? 400 : 600,
        whiteSpace: 'nowrap',
      }}
    >
      <Icon aria-hidden="true" sx={{ fontSize: '1.1em', verticalAlign: '-0.16em', mr: 0.5 }} />
      {`${verdict}${withUnit}`}
    </Box>
  );
}

/** A shortfall smaller than the shown decimals still reads as a shortfall. */
function amount(gap: number, decimals: number): string {
  const least = 10 ** -decimals;
  return gap > 0 && gap < least / 2 ? `less than ${least}` : formatFixed(gap, decimals);
}

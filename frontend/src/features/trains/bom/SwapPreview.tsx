import TableBody from '@mui/material/TableBody';
import TableCell from '@mui/material/TableCell';
import TableContainer from '@mui/material/TableContainer';
import TableHead from '@mui/material/TableHead';
import TableRow from '@mui/material/TableRow';
import Typography from '@mui/material/Typography';
import Box from '@mui/material/Box';
import type { SwapResult } from '../../../api/types';
import { CopyTable } from '../../../components/CopyTable';
import { formatFixed, NOTHING } from '../../../components/figures';
import { LoadingRows } from '../../../components/LoadingRows';
import { VerdictWord } from '../../../components/VerdictWord';

/** Before and after of everything a swap changes: checks with their verdicts, price, arrival, mass. */
export function SwapPreview({ result, loading }: { result: SwapResult | null; loading: boolean }) {
  if (result === null) {
    return loading ? <LoadingRows rows={3} label="Working out what changes" /> : null;
  }
  const { changes, checks } = result;
  // Figures first; sentences would push them out of sight.
  const isRemark = ({ what }: Change) => /^(Finding|Flag)/.test(what);
  const remarks = changes.filter(isRemark);
  const figures = changes.filter((change) => !isRemark(change));
  return (
    <Box ref={intoView} sx={boxSx}>
      <Typography variant="h2" component="h3">
        What changes
      </Typography>
      {changes.length === 0 && checks.length === 0 ? (
        <Typography>Nothing but the part itself.</Typography>
      ) : (
        <TableContainer>
          <CopyTable label="What changes">
            <TableHead>
              <TableRow>
                <TableCell>What</TableCell>
                <TableCell sx={WIDE}>Before</TableCell>
                <TableCell sx={WIDE}>After</TableCell>
                <TableCell sx={{ width: 76 }}>Verdict</TableCell>
              </TableRow>
            </TableHead>
            <TableBody>
              <ChangeRows changes={figures} />
              {checks.map(({ label, stage, unit, before, after }) => (
                <TableRow key={`${label} ${stage}`}>
                  <TableCell component="th" scope="row" sx={{ fontWeight: 400 }}>
                    {label}
                    {stage !== null && `, stage ${stage + 1}`}
                    <Box sx={PHONE}>
                      <CheckState state={before} unit={unit} /> → <CheckState state={after} unit={unit} />
                    </Box>
                  </TableCell>
                  <TableCell sx={WIDE}>
                    <CheckState state={before} unit={unit} />
                  </TableCell>
                  <TableCell sx={WIDE}>
                    <CheckState state={after} unit={unit} />
                  </TableCell>
                  <TableCell>
                    <Comparison verdict={compared(before?.verdict, after?.verdict)} />
                  </TableCell>
                </TableRow>
              ))}
              <ChangeRows changes={remarks} />
            </TableBody>
          </CopyTable>
        </TableContainer>
      )}
    </Box>
  );
}

/** Under a long list of choices on a small screen it would stand out of sight. */
function intoView(element: HTMLElement | null): void {
  if (globalThis.matchMedia('(max-width: 899px)').matches) element?.scrollIntoView({ block: 'nearest' });
}

/** On a phone before and after stand under what they are of. */
const WIDE = { display: { xs: 'none', sm: 'table-cell' } } as const;
const PHONE = { display: { sm: 'none' }, color: 'text.secondary', fontSize: '0.8125rem' } as const;

const boxSx = {
  mt: { xs: 1.5, md: 0 },
  pt: { xs: 1, md: 0 },
  borderTop: { xs: '1px solid', md: 0 },
  pl: { md: 2 },
  borderLeft: { md: '1px solid' },
  borderColor: { xs: 'line.strong', md: 'line.rule' },
} as const;

type Change = SwapResult['changes'][number];
type Check = SwapResult['checks'][number];

function ChangeRows({ changes }: { changes: readonly Change[] }) {
  return (
    <>
      {changes.map(({ what, before, after, verdict }, at) => (
        <TableRow key={`${what} ${at}`}>
          <TableCell component="th" scope="row" sx={{ fontWeight: 400 }}>
            {what}
            <Box sx={PHONE}>{`${before || NOTHING} → ${after || NOTHING}`}</Box>
          </TableCell>
          <TableCell sx={WIDE}>{before || NOTHING}</TableCell>
          <TableCell sx={WIDE}>{after || NOTHING}</TableCell>
          <TableCell>
            <Comparison verdict={verdict} />
          </TableCell>
        </TableRow>
      ))}
    </>
  );
}

function CheckState({ state, unit }: { state: Check['before']; unit: string }) {
  if (state === null) return <>{NOTHING}</>;
  return (
    <>
      {state.value !== null && `${formatFixed(state.value, 3)} ${unit} `}
      <VerdictWord verdict={state.verdict} />
    </>
  );
}

const RANK = { passes: 0, marginal: 1, fails: 2 } as const;

/** A check that got a better verdict is better; with the same verdict it is neither. */
function compared(
  before: keyof typeof RANK | undefined,
  after: keyof typeof RANK | undefined,
): 'better' | 'worse' | null {
  const step = RANK[after ?? 'passes'] - RANK[before ?? 'passes'];
  if (step === 0) return null;
  return step > 0 ? 'worse' : 'better';
}

function Comparison({ verdict }: { verdict: 'better' | 'worse' | 'same' | null }) {
  if (verdict === null || verdict === 'same') return <>{verdict ?? ''}</>;
  return (
    <Box
      component="span"
      sx={{ color: verdict === 'better' ? 'success.main' : 'error.main', fontWeight: 600 }}
    >
      {verdict}
    </Box>
  );
}

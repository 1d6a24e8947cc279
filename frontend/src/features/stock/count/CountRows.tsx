import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { changeWords, quantityWords } from '../../../components/stock/stockWords';
import type { Count } from './countTypes';

interface CountRowsProps {
  counts: readonly Count[];
  onRemove: (count: Count) => void;
  onAgain: (count: Count) => void;
  onSendAgain: (count: Count) => void;
}

/** What was counted in this round, the latest first, with what it changes and whether the server has it. */
export function CountRows({ counts, ...acts }: CountRowsProps) {
  return (
    <Box component="ul" aria-label="Counted in this round" sx={{ listStyle: 'none', m: 0, p: 0 }}>
      {[...counts].reverse().map((count) => (
        <Row key={count.key} count={count} {...acts} />
      ))}
    </Box>
  );
}

function Row({ count, onRemove, onAgain, onSendAgain }: { count: Count } & Omit<CountRowsProps, 'counts'>) {
  const { number, description, counted, unit, place, state } = count;
  return (
    <Box component="li" sx={{ borderTop: 1, borderColor: 'line.rule', px: 1.25, py: 1 }}>
      <Box sx={{ display: 'flex', gap: 1, alignItems: 'baseline' }}>
        <Typography component="span" className="part-number" sx={{ fontWeight: 600 }}>
          {number}
        </Typography>
        <Typography component="span" color="textSecondary" sx={{ flex: 1, minWidth: 0 }}>
          {description}
        </Typography>
        <Typography component="span" className="number" sx={{ whiteSpace: 'nowrap', fontWeight: 600 }}>
          {quantityWords(counted, unit)}
        </Typography>
      </Box>
      <Typography color={state === 'refused' ? 'error' : 'textSecondary'}>
        {place} · {differenceWords(count)} · {STATES[state]}
      </Typography>
      {state === 'refused' && (
        <>
          <Typography sx={{ my: 0.5 }}>{count.refusal}</Typography>
          <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: 1 }}>
            {count.now !== null && (
              <Button variant="outlined" sx={touchSx} onClick={() => onSendAgain(count)}>
                {quantityWords(counted, unit)} is right: send it
              </Button>
            )}
            <Button variant="outlined" sx={touchSx} onClick={() => onAgain(count)}>
              Count again
            </Button>
            <Button sx={touchSx} onClick={() => onRemove(count)}>
              Drop it
            </Button>
          </Box>
        </>
      )}
    </Box>
  );
}

const STATES: Record<Count['state'], string> = {
  waiting: 'kept on this device, not sent yet',
  sent: 'booked',
  refused: 'not booked',
};

/** What the count changes in the books, once that is known. */
function differenceWords({ counted, expected, change, unit }: Count): string {
  const difference = change ?? (expected === null ? null : counted - expected);
  if (difference === null) return 'what the books say is not known yet';
  if (difference === 0) return 'as in the books';
  return `${changeWords(difference)} ${unit} to the books`;
}

const touchSx = { minHeight: 44 } as const;

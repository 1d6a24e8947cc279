import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { useState } from 'react';
import { changeWords, quantityWords } from '../../../components/stock/stockWords';
import type { FoundPart } from './lookUp';

/** A scanner or a second Enter right behind the figure must not say yes, ms. */
const PAUSE = 500;

interface SurpriseStepProps {
  part: FoundPart;
  counted: number;
  onKeep: () => void;
  onAgain: () => void;
}

/** A figure far from the books: counted again, or kept. */
export function SurpriseStep({ part, counted, onKeep, onAgain }: SurpriseStepProps) {
  const [since] = useState(() => performance.now());
  const expected = part.expected ?? 0;
  return (
    <>
      <Alert severity="warning">
        You counted {quantityWords(counted, part.unit)} of {part.number}; the books say{' '}
        {quantityWords(expected, part.unit)}. That is {changeWords(counted - expected)}.
      </Alert>
      <Box sx={{ display: 'flex', gap: 1, mt: 1.5 }}>
        <Button variant="outlined" autoFocus sx={{ flex: 1, minHeight: 48 }} onClick={onAgain}>
          Count again
        </Button>
        <Button
          variant="contained"
          sx={{ flex: 1, minHeight: 48 }}
          onClick={() => {
            if (performance.now() - since > PAUSE) onKeep();
          }}
        >
          Keep {quantityWords(counted, part.unit)}
        </Button>
      </Box>
    </>
  );
}

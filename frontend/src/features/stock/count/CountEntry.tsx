import Box from '@mui/material/Box';
import { useState } from 'react';
import { Problem } from '../../../api/problem';
import { newRequestKey } from '../../../components/stock/requestKey';
import { Sheet } from '../../../components/Sheet';
import type { Count } from './countTypes';
import { lookUp, type FoundPart } from './lookUp';
import { NumberStep } from './NumberStep';
import { QuantityStep } from './QuantityStep';
import { SurpriseStep } from './SurpriseStep';
import { isSurprising } from './roundChanges';

interface CountEntryProps {
  place: string;
  /** A number to begin with: a count that is made again. */
  start: string;
  onCount: (count: Count) => void;
}

/**
 * One count after the other: the number, what is there, next. What the books say stays hidden until the figure is
 * typed, so that nobody counts what they expect; a figure far from it is asked about.
 */
export function CountEntry({ place, start, onCount }: CountEntryProps) {
  const [part, setPart] = useState<FoundPart | null>(null);
  const [surprise, setSurprise] = useState<number | null>(null);
  const [typed, setTyped] = useState('');
  const [last, setLast] = useState(start);

  const find = async (number: string): Promise<string | null> => {
    const result = await lookUp(place, number);
    if (result instanceof Problem) return result.message;
    setPart(result);
    setTyped('');
    return null;
  };
  const keep = (counted: number) => {
    if (part === null) return;
    onCount({
      ...part,
      key: newRequestKey(),
      place,
      counted,
      at: new Date().toISOString(),
      state: 'waiting',
      refusal: null,
      change: null,
      now: null,
    });
    setPart(null);
    setSurprise(null);
    setLast('');
  };

  return (
    <Sheet sx={{ mb: 2 }}>
      <Box sx={{ minHeight: 150 }}>
        {part === null && <NumberStep start={last} onFind={find} />}
        {part !== null && surprise === null && (
          <QuantityStep
            part={part}
            start={typed}
            onBack={() => {
              setLast(part.number);
              setPart(null);
            }}
            onQuantity={(counted, text) => {
              setTyped(text);
              if (isSurprising(counted, part.expected)) setSurprise(counted);
              else keep(counted);
            }}
          />
        )}
        {part !== null && surprise !== null && (
          <SurpriseStep
            part={part}
            counted={surprise}
            onKeep={() => keep(surprise)}
            onAgain={() => {
              setTyped('');
              setSurprise(null);
            }}
          />
        )}
      </Box>
    </Sheet>
  );
}

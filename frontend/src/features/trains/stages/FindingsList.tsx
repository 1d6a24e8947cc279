import Box from '@mui/material/Box';
import type { Train } from '../../../api/types';
import { Sheet } from '../../../components/Sheet';
import { VerdictWord } from '../../../components/VerdictWord';

const VERDICTS = { fail: 'fails', marginal: 'marginal', note: 'note' } as const;

interface FindingsListProps {
  findings: readonly Train['figures']['findings'][number][];
  /** Said when there are none. */
  none: string;
}

/** Everything the geometry and the chosen parts have to say, worst first. */
export function FindingsList({ findings, none }: FindingsListProps) {
  const order = ['fail', 'marginal', 'note'];
  const sorted = [...findings].sort((a, b) => order.indexOf(a.severity) - order.indexOf(b.severity));
  return (
    <Sheet title="Findings">
      {sorted.length === 0 ? (
        <Box sx={{ color: 'text.secondary' }}>{none}</Box>
      ) : (
        <Box component="ul" sx={{ m: 0, p: 0, listStyle: 'none', display: 'grid', rowGap: 0.75 }}>
          {sorted.map(({ code, severity, message }) => (
            <Box
              component="li"
              key={code + message}
              sx={{ display: 'flex', gap: 1.5, alignItems: 'baseline' }}
            >
              <Box sx={{ width: 84, flexShrink: 0 }}>
                <VerdictWord verdict={VERDICTS[severity]} />
              </Box>
              <span>{message}</span>
            </Box>
          ))}
        </Box>
      )}
    </Sheet>
  );
}

import Button from '@mui/material/Button';
import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import type { Requirement, WhyNot } from '../../../api/types';
import { stageCountWords } from '../../../components/optionWords';
import { Sheet } from '../../../components/Sheet';
import { leastNeeds } from './leastNeeds';

interface WhyNotPanelProps {
  whyNot: readonly WhyNot[];
  /** What was searched: where several limits stand in the way, their least figures follow from it. */
  request: Requirement;
  /** Opens the brief with the least change that would let the count in; left out for readers. */
  onTry?: (change: NonNullable<WhyNot['relaxed']>) => void;
}

/** For every stage count without an option: which limit stands in the way, and the least that would do. */
export function WhyNotPanel({ whyNot, request, onTry }: WhyNotPanelProps) {
  if (whyNot.length === 0) return null;
  return (
    <Sheet>
      <Box sx={{ display: 'grid', rowGap: 1.5 }}>
        {whyNot.map(({ stages, limit, message, relaxed }) => (
          <section key={`${stages}-${limit}`}>
            <Typography variant="h2">Why not {stageCountWords(stages).toLowerCase()}</Typography>
            <Typography sx={{ mt: 0.25 }}>
              {(limit === 'several' ? [message, ...leastNeeds(stages, request)] : [message]).join(' ')}
            </Typography>
            {relaxed && onTry && (
              <Button
                variant="text"
                onClick={() => onTry(relaxed)}
                sx={{ ml: -1, minHeight: 28, fontWeight: 500 }}
              >
                {limit === 'objective'
                  ? 'Open the brief for this count alone'
                  : 'Open the brief with this change'}
              </Button>
            )}
          </section>
        ))}
      </Box>
    </Sheet>
  );
}

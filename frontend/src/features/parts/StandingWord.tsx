import Box from '@mui/material/Box';
import type { PartStanding } from '../../api/types';

const LOOK: Record<PartStanding, { mark: string; colour: string }> = {
  draft: { mark: '○', colour: 'info.main' },
  cleared: { mark: '●', colour: 'success.main' },
  withdrawn: { mark: '✕', colour: 'error.main' },
};

/** A part's standing: a mark and the word, never colour alone. */
export function StandingWord({ standing }: { standing: PartStanding }) {
  const { mark, colour } = LOOK[standing];
  return (
    <Box component="span" sx={{ color: colour, whiteSpace: 'nowrap' }}>
      <span aria-hidden="true">{mark} </span>
      {standing}
    </Box>
  );
}

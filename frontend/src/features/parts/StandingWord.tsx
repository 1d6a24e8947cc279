import Box from '@mui/material/Box';
import type { PartStanding } from '../../api/types';

const LOOK: Record<PartStanding, { mark: string; filled: boolean; colour: string }> = {
  draft: { mark: 'M6 2.2a3.8 3.8 0 1 1 0 7.6a3.8 3.8 0 1 1 0-7.6', filled: false, colour: 'info.main' },
  cleared: { mark: 'M6 1.7a4.3 4.3 0 1 1 0 8.6a4.3 4.3 0 1 1 0-8.6', filled: true, colour: 'success.main' },
  withdrawn: { mark: 'M2.5 2.5l7 7M9.5 2.5l-7 7', filled: false, colour: 'error.main' },
};

/** A part's standing: a mark (ring, disc, cross) and the word, never colour alone. */
export function StandingWord({ standing }: { standing: PartStanding }) {
  const { mark, filled, colour } = LOOK[standing];
  return (
    <Box component="span" sx={{ color: colour, whiteSpace: 'nowrap' }}>
      <svg
        width="12"
        height="12"
        viewBox="0 0 12 12"
        aria-hidden="true"
        style={{ marginRight: 5, verticalAlign: '-1px' }}
      >
        <path
          d={mark}
          fill={filled ? 'currentColor' : 'none'}
          stroke="currentColor"
          strokeWidth={filled ? 0 : 1.5}
        />
      </svg>
      {standing}
    </Box>
  );
}

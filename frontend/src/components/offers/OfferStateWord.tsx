import Box from '@mui/material/Box';
import type { Offer } from '../../api/types';

const LOOK: Record<Offer['state'], { word: string; mark: string; filled: boolean; colour: string }> = {
  valid: {
    word: 'valid',
    mark: 'M6 1.7a4.3 4.3 0 1 1 0 8.6a4.3 4.3 0 1 1 0-8.6',
    filled: true,
    colour: 'success.main',
  },
  'not-yet': {
    word: 'not yet',
    mark: 'M6 2.2a3.8 3.8 0 1 1 0 7.6a3.8 3.8 0 1 1 0-7.6',
    filled: false,
    colour: 'info.main',
  },
  expired: { word: 'ended', mark: 'M2.5 2.5l7 7M9.5 2.5l-7 7', filled: false, colour: 'error.main' },
  closed: { word: 'closed', mark: 'M2 6h8', filled: false, colour: 'text.secondary' },
};

interface OfferStateWordProps {
  state: Offer['state'];
  /** In place of the state's own word, where they say as much: "until 5 Jun 2027". */
  words?: string;
}

/** Whether an offer can be ordered from: a mark and a word, never colour alone. */
export function OfferStateWord({ state, words }: OfferStateWordProps) {
  const { word, mark, filled, colour } = LOOK[state];
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
      {words ?? word}
    </Box>
  );
}

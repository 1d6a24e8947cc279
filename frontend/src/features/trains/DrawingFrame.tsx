import Box from '@mui/material/Box';
import type { ReactNode } from 'react';

/** A drawing keeps a width at which its lettering can be read; on a phone it scrolls sideways inside its sheet. */
export function DrawingFrame({ label, children }: { label: string; children: ReactNode }) {
  return (
    <Box role="region" aria-label={label} tabIndex={0} sx={{ overflowX: 'auto' }}>
      <Box sx={{ minWidth: 640, '@media print': { minWidth: 0 } }}>{children}</Box>
    </Box>
  );
}

import Box from '@mui/material/Box';
import type { SxProps, Theme } from '@mui/material/styles';
import Typography from '@mui/material/Typography';
import { useId, type ReactNode } from 'react';

interface SheetProps {
  title?: ReactNode;
  /** To the right of the title: a link or a small control. */
  aside?: ReactNode;
  children: ReactNode;
  /** Content that brings its own edges (tables, drawings) goes flush to the sheet's. */
  flush?: boolean;
  sx?: SxProps<Theme>;
}

/** A white sheet with a hairline edge on the paper: tables, forms and drawings lie on one. */
export function Sheet({ title, aside, children, flush = false, sx }: SheetProps) {
  const id = useId();
  const named = title !== undefined;
  return (
    <Box
      component="section"
      aria-labelledby={named ? id : undefined}
      sx={
        [
          { bgcolor: 'background.paper', border: '1px solid', borderColor: 'line.rule', minWidth: 0 },
          ...(Array.isArray(sx) ? (sx as SxProps<Theme>[]) : [sx ?? {}]),
        ] as SxProps<Theme>
      }
    >
      {named && (
        <Box
          sx={{
            display: 'flex',
            alignItems: 'baseline',
            gap: 2,
            px: flush ? 1.25 : 1.75,
            pt: 1.25,
            pb: flush ? 0.75 : 0,
          }}
        >
          <Typography variant="h2" id={id} sx={{ flex: 1 }}>
            {title}
          </Typography>
          {aside}
        </Box>
      )}
      {flush ? children : <Box sx={{ px: 1.75, py: 1.25 }}>{children}</Box>}
    </Box>
  );
}

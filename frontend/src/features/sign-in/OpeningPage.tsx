import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { useEffect, type ReactNode } from 'react';
import { TrainFigure } from './TrainFigure';

/** The frame of the pages before sign-in: the form on a sheet, and a train at work beside it. */
export function OpeningPage({ title, children }: { title: string; children: ReactNode }) {
  useEffect(() => {
    document.title = `${title} · Stageyard`;
  }, [title]);
  return (
    <Box sx={{ minHeight: '100dvh', display: 'grid', gridTemplateColumns: { xs: '1fr', md: '460px 1fr' } }}>
      <Box
        component="main"
        sx={{
          bgcolor: 'background.paper',
          borderRight: { md: '1px solid' },
          borderColor: { md: 'line.rule' },
          px: { xs: 3, sm: 6 },
          py: { xs: 4, md: 8 },
        }}
      >
        <Box sx={{ maxWidth: 372, mx: 'auto' }}>
          <Typography component="p" sx={{ fontSize: 22, fontWeight: 600, color: 'primary.main', mb: 4 }}>
            Stageyard
          </Typography>
          <Typography variant="h1">{title}</Typography>
          {children}
        </Box>
      </Box>
      <Box
        sx={{
          display: { xs: 'none', md: 'flex' },
          flexDirection: 'column',
          justifyContent: 'center',
          px: { md: 4, lg: 7 },
          py: 4,
          minWidth: 0,
        }}
      >
        {/* Never taller than the window leaves room for with the words beneath. */}
        <Box sx={{ width: '100%', maxWidth: 'min(1100px, calc((100dvh - 190px) * 1.5))', mx: 'auto' }}>
          <TrainFigure />
          <Typography sx={{ mt: 3, fontSize: 19, lineHeight: 1.4, fontWeight: 500 }}>
            From a brief to a train that runs, fits and can be bought.
          </Typography>
          <Typography color="textSecondary" sx={{ mt: 0.5, maxWidth: 620 }}>
            State the ratio, the room and the duty. See every sensible train to scale, one stage against
            several, and take the bill of materials to purchasing.
          </Typography>
        </Box>
      </Box>
    </Box>
  );
}

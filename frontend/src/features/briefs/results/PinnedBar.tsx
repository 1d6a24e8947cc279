import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import type { Brief } from '../../../api/types';
import { AdoptDialog } from '../../../components/AdoptDialog';
import { teethWords } from '../../../components/optionWords';

/** What is pinned and what can be done with it; stays in sight at the foot of the page. */
export function PinnedBar({ brief, canAdopt }: { brief: Brief; canAdopt: boolean }) {
  const [adopting, setAdopting] = useState(false);
  const { pins } = brief;
  if (pins.length === 0) return null;
  return (
    // The paper behind the bar hides the rows that scroll under it.
    <Box
      component="section"
      aria-label="Pinned options"
      sx={{
        position: 'sticky',
        bottom: 0,
        zIndex: 3,
        pt: 0.25,
        pb: 0.25,
        mb: -3,
        displayPrint: 'none',
        bgcolor: 'background.default',
      }}
    >
      <Box
        sx={{
          display: 'flex',
          alignItems: 'center',
          flexWrap: 'wrap',
          columnGap: 2,
          rowGap: 0.5,
          px: 1.5,
          py: 0.25,
          '& .MuiButton-root': { minHeight: 28, py: 0 },
          bgcolor: 'background.paper',
          border: '1px solid',
          borderColor: 'secondary.main',
        }}
      >
        <Typography component="p" variant="body2" sx={{ flex: '1 1 220px', minWidth: 0 }}>
          <Box component="strong" sx={{ fontWeight: 600, mr: 1.5 }}>
            {pins.length} pinned
          </Box>
          <Box component="span" sx={{ color: 'text.secondary' }}>
            {joined(pins.map(({ option }) => teethWords(option.stages)))}
          </Box>
        </Typography>
        <Button variant="outlined" component={Link} to={`/briefs/${encodeURIComponent(brief.id)}/compare`}>
          {pins.length === 1 ? 'Look closer' : 'Compare side by side'}
        </Button>
        {canAdopt && (
          <Button variant="contained" onClick={() => setAdopting(true)}>
            Adopt as train
          </Button>
        )}
      </Box>
      {adopting && <AdoptDialog brief={brief} pins={pins} onClose={() => setAdopting(false)} />}
    </Box>
  );
}

function joined(items: string[]): string {
  return items.length < 2 ? items.join('') : `${items.slice(0, -1).join(', ')} and ${items.at(-1)}`;
}

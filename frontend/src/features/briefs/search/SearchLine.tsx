import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import LinearProgress from '@mui/material/LinearProgress';
import Typography from '@mui/material/Typography';
import type { Search } from '../../../api/types';
import { optionCount, outcomeWords, progressPercent, progressWords } from './searchWords';

interface RunningLineProps {
  search: Search;
  connected: boolean;
  /** Left out for people who may not stop it. */
  onStop?: () => void;
  stopping: boolean;
}

/** A search under way: what it is doing, how far it is, and Stop. */
export function RunningLine({ search, connected, onStop, stopping }: RunningLineProps) {
  const percent = progressPercent(search.progress);
  return (
    <Box
      sx={{
        bgcolor: 'background.paper',
        border: '1px solid',
        borderColor: 'line.rule',
        px: 2,
        py: 1.25,
        mb: 1.5,
      }}
    >
      <Box sx={{ display: 'flex', alignItems: 'center', gap: 2, flexWrap: 'wrap' }}>
        <Typography role="status" sx={{ flex: '1 1 260px' }}>
          <Box component="strong" sx={{ fontWeight: 600, mr: 1.5 }}>
            Searching
          </Box>
          {progressWords(search.progress)}
        </Typography>
        {onStop && (
          <Button variant="outlined" onClick={onStop} disabled={stopping}>
            {stopping ? 'Stopping…' : 'Stop'}
          </Button>
        )}
      </Box>
      <LinearProgress
        aria-label="Combinations settled"
        variant={percent === null ? 'indeterminate' : 'determinate'}
        value={percent ?? undefined}
        sx={{ mt: 1, height: 3 }}
      />
      <Typography variant="body2" color="textSecondary" sx={{ mt: 0.75 }}>
        {connected
          ? 'The search goes on when you leave this page.'
          : 'Connection lost; the search goes on at the server. Asking again every 3 s.'}
      </Typography>
    </Box>
  );
}

/** A search that has ended: how many options, and what the search can say for them. */
export function OutcomeLine({ search, shown }: { search: Search; shown: number }) {
  const outcome = search.outcome;
  if (!outcome) return null;
  const total = outcome.options.length;
  const count = shown === total ? optionCount(total) : `${shown} of ${optionCount(total)}`;
  return (
    <Typography
      component="p"
      variant="body2"
      role="status"
      sx={{ flex: '1 1 320px', color: 'text.secondary' }}
    >
      <Box component="strong" sx={{ fontWeight: 600, color: 'text.primary', mr: 1.5 }}>
        {count}
      </Box>
      {outcomeWords(search, outcome)}
    </Typography>
  );
}

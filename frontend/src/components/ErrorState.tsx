import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import type { Problem } from '../api/problem';
import { NoPermission } from './NoPermission';

interface ErrorStateProps {
  problem: Problem;
  /** Asks again; leave it out where asking again cannot help. */
  onRetry?: () => void;
  /** What was being fetched: "the parts". */
  what?: string;
}

/** A list or page that could not be fetched: what, why, and a retry. */
export function ErrorState({ problem, onRetry, what = 'this page' }: ErrorStateProps) {
  if (problem.statusCode === 403) return <NoPermission message={problem.message} />;
  const missing = problem.statusCode === 404;
  return (
    <Box role="alert" sx={{ py: 3, px: 2, maxWidth: 560 }}>
      <Typography variant="h2" gutterBottom>
        {missing ? 'Not found' : `Could not load ${what}`}
      </Typography>
      <Typography color="textSecondary" sx={{ mb: 1.5 }}>
        {problem.message}
        {problem.requestId !== null && !missing && ` (request ${problem.requestId})`}
      </Typography>
      {onRetry && !missing && (
        <Button variant="outlined" onClick={onRetry}>
          Try again
        </Button>
      )}
    </Box>
  );
}

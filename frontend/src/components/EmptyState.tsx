import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import type { ReactNode } from 'react';

interface EmptyStateProps {
  /** What is not there: "No briefs yet". */
  title: string;
  /** What to do next, in one or two sentences. */
  children?: ReactNode;
  action?: ReactNode;
}

/** An empty list: says so, and says what to do next. */
export function EmptyState({ title, children, action }: EmptyStateProps) {
  return (
    <Box sx={{ py: 2, px: 1.25, maxWidth: 560 }}>
      <Typography variant="h3" component="p" gutterBottom>
        {title}
      </Typography>
      {children !== undefined && (
        <Typography component="div" color="textSecondary" sx={{ mb: action === undefined ? 0 : 1.5 }}>
          {children}
        </Typography>
      )}
      {action}
    </Box>
  );
}

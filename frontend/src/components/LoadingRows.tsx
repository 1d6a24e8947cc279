import Box from '@mui/material/Box';
import Skeleton from '@mui/material/Skeleton';

interface LoadingRowsProps {
  rows?: number;
  /** Height of one row in px; the table's own, so that nothing jumps when the rows arrive. */
  height?: number;
  /** What is being fetched, for a screen reader. */
  label?: string;
}

/** Skeleton of a table while its rows are on the way. */
export function LoadingRows({ rows = 8, height = 32, label = 'Loading' }: LoadingRowsProps) {
  return (
    <Box role="status" aria-label={label} aria-busy="true" sx={{ px: 1.25 }}>
      {Array.from({ length: rows }, (_, row) => (
        <Box key={row} sx={{ height, display: 'flex', alignItems: 'center', gap: 2 }}>
          <Skeleton width={90} height={16} />
          <Skeleton width={`${45 - ((row * 7) % 20)}%`} height={16} />
          <Skeleton width={60} height={16} sx={{ ml: 'auto' }} />
        </Box>
      ))}
    </Box>
  );
}

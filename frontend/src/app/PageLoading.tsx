import Box from '@mui/material/Box';
import Skeleton from '@mui/material/Skeleton';

/** What stands in a page's place while its code arrives. */
export function PageLoading() {
  return (
    <Box role="status" aria-label="Loading the page" sx={{ p: 3 }}>
      <Skeleton width={260} height={32} />
      <Skeleton width={420} height={20} />
    </Box>
  );
}

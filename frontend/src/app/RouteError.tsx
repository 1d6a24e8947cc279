import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Link from '@mui/material/Link';
import Typography from '@mui/material/Typography';
import { Link as RouterLink, useRouteError } from 'react-router-dom';
import { Problem } from '../api/problem';

/** The error boundary of one route: says what happened and offers the two ways out. */
export function RouteError() {
  const error = useRouteError();
  const newVersion = error instanceof TypeError && /import|module|fetch/i.test(error.message);
  const message = newVersion
    ? 'Part of the page could not be loaded. The server may be restarting or may have been updated.'
    : error instanceof Problem
      ? error.message
      : 'Something on this page failed while it was drawn. Your saved work is not affected.';
  return (
    <Box role="alert" sx={{ p: 3, maxWidth: 560 }}>
      <Typography variant="h1" gutterBottom>
        This page stopped
      </Typography>
      <Typography sx={{ mb: 2 }}>{message}</Typography>
      <Box sx={{ display: 'flex', gap: 2, alignItems: 'center' }}>
        <Button variant="contained" onClick={() => window.location.reload()}>
          Load it again
        </Button>
        <Link component={RouterLink} to="/">
          Go to Today
        </Link>
      </Box>
    </Box>
  );
}

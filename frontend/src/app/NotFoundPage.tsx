import Link from '@mui/material/Link';
import Typography from '@mui/material/Typography';
import { Link as RouterLink, useLocation } from 'react-router-dom';
import { PageHeader } from '../components/PageHeader';

export function NotFoundPage() {
  const { pathname } = useLocation();
  return (
    <>
      <PageHeader title="Nothing stands at this address" />
      <Typography sx={{ maxWidth: 560 }}>
        <b>{pathname}</b> is not a page of Stageyard. The link may be mistyped or from an older version. Press{' '}
        <kbd>/</kbd> to search, or{' '}
        <Link component={RouterLink} to="/">
          go to Today
        </Link>
        .
      </Typography>
    </>
  );
}

import Link from '@mui/material/Link';
import { Link as RouterLink } from 'react-router-dom';

/** At the head of a short list: the way to the whole of it. */
export function MoreLink({ to, text }: { to: string; text: string }) {
  return (
    <Link component={RouterLink} to={to}>
      {text}
    </Link>
  );
}

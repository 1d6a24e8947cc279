import Link from '@mui/material/Link';
import { Link as RouterLink } from 'react-router-dom';

/** The code that a row begins with, as its link. */
export function CodeLink({ to, code }: { to: string; code: string }) {
  return (
    <Link component={RouterLink} to={to} className="part-number">
      {code}
    </Link>
  );
}

import MuiLink from '@mui/material/Link';
import { Link } from 'react-router-dom';

/** A part number that leads to its part; it never wraps. */
export function PartLink({ number }: { number: string }) {
  return (
    <MuiLink component={Link} to={`/parts/${encodeURIComponent(number)}`} className="part-number">
      {number}
    </MuiLink>
  );
}

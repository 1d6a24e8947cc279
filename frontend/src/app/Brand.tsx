import Box from '@mui/material/Box';
import { Link } from 'react-router-dom';

/** The mark (a full disc and a ring in mesh) and the name. */
export function Brand({ linked = true }: { linked?: boolean }) {
  const content = (
    <Box
      sx={{
        display: 'flex',
        alignItems: 'center',
        gap: 1,
        color: 'primary.main',
        fontWeight: 600,
        fontSize: 17,
      }}
    >
      <svg width="27" height="16" viewBox="0 0 27 16" aria-hidden="true">
        <circle cx="7" cy="8" r="5.6" fill="currentColor" />
        <circle
          cx="18.6"
          cy="8"
          r="5"
          fill="none"
          stroke="var(--sy-palette-secondary-main)"
          strokeWidth="2"
        />
      </svg>
      Stageyard
    </Box>
  );
  if (!linked) return content;
  return (
    <Link to="/" style={{ textDecoration: 'none' }} aria-label="Stageyard, today">
      {content}
    </Link>
  );
}

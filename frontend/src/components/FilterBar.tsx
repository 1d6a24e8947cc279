import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import type { ReactNode } from 'react';

interface FilterBarProps {
  children: ReactNode;
  filterCount: number;
  onClear: () => void;
  /** What the filters leave: "1,204 parts". */
  result?: ReactNode;
  /** At the right end: actions on the list. */
  aside?: ReactNode;
}

/** The row of filters over a table; every filter lives in the address. */
export function FilterBar({ children, filterCount, onClear, result, aside }: FilterBarProps) {
  return (
    <Box
      role="search"
      aria-label="Filters"
      sx={{ display: 'flex', flexWrap: 'wrap', alignItems: 'flex-end', gap: 1, mb: 1 }}
    >
      {children}
      {filterCount > 0 && (
        <Button
          onClick={onClear}
          aria-label={filterCount === 1 ? 'Clear the filter' : `Clear ${filterCount} filters`}
        >
          Clear
        </Button>
      )}
      <Box sx={{ ml: 'auto', display: 'flex', alignItems: 'center', gap: 1.5, minHeight: 34 }}>
        {result !== undefined && (
          <Typography color="textSecondary" component="span" role="status">
            {result}
          </Typography>
        )}
        {aside}
      </Box>
    </Box>
  );
}

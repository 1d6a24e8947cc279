import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { GridFooterContainer, GridPagination } from '@mui/x-data-grid';

declare module '@mui/x-data-grid' {
  interface FooterPropsOverrides {
    count?: number;
    onCopy?: () => void;
    onClear?: () => void;
  }
}

interface SelectableFooterProps {
  count?: number;
  onCopy?: () => void;
  onClear?: () => void;
}

/** Foot of a data table: how many rows are ticked and what can be done with them, then the pages. */
export function SelectableFooter({ count = 0, onCopy, onClear }: SelectableFooterProps) {
  return (
    <GridFooterContainer>
      <Box sx={{ display: 'flex', alignItems: 'center', gap: 0.5, px: 1.25 }}>
        {count > 0 && (
          <>
            <Box component="span" aria-live="polite" sx={{ mr: 1, whiteSpace: 'nowrap' }}>
              {count === 1 ? '1 row selected' : `${count} rows selected`}
            </Box>
            <Button variant="outlined" onClick={onCopy} sx={{ minHeight: 28, py: 0 }}>
              Copy
            </Button>
            <Button variant="text" onClick={onClear} sx={{ minHeight: 28, py: 0 }}>
              Clear
            </Button>
          </>
        )}
      </Box>
      <GridPagination />
    </GridFooterContainer>
  );
}

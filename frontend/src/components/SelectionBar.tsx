import Box from '@mui/material/Box';
import Button from '@mui/material/Button';

interface SelectionBarProps {
  count: number;
  onCopy: () => void;
  onClear: () => void;
}

/** What can be done with the selected rows; stands at the foot of the window while there are any. */
export function SelectionBar({ count, onCopy, onClear }: SelectionBarProps) {
  if (count === 0) return null;
  return (
    <Box
      role="toolbar"
      aria-label="Selected rows"
      sx={{
        position: 'fixed',
        // Above what is pinned at the foot of a page, and beside the line that tells of a copy.
        bottom: 56,
        left: '50%',
        transform: 'translateX(-50%)',
        zIndex: 'snackbar',
        display: 'flex',
        alignItems: 'center',
        gap: 0.5,
        pl: 1.75,
        pr: 0.75,
        py: 0.5,
        whiteSpace: 'nowrap',
        displayPrint: 'none',
        bgcolor: 'background.paper',
        border: '1px solid',
        borderColor: 'secondary.main',
        borderRadius: '3px',
        boxShadow: '0 6px 20px rgb(0 0 0 / 0.16)',
        '& .MuiButton-root': { minHeight: 28, py: 0 },
      }}
    >
      <Box component="span" aria-live="polite" sx={{ mr: 1 }}>
        {count === 1 ? '1 row selected' : `${count} rows selected`}
      </Box>
      <Button variant="outlined" onClick={onCopy}>
        Copy
      </Button>
      <Button variant="text" onClick={onClear}>
        Clear
      </Button>
    </Box>
  );
}

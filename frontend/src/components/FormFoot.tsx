import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';

interface FormFootProps {
  refusal: string | null;
  saveName: string;
  saving: boolean;
  onCancel: () => void;
}

/** Stays at the foot of a form: save, cancel, and what the server refused. */
export function FormFoot({ refusal, saveName, saving, onCancel }: FormFootProps) {
  return (
    <Box sx={barSx}>
      {/* Here, beside the button that was pressed: the head of a long form is out of sight. */}
      {refusal !== null && (
        <Alert severity="error" sx={{ flexBasis: '100%' }}>
          {refusal}
        </Alert>
      )}
      <Button type="submit" variant="contained" disabled={saving}>
        {saving ? 'Saving…' : saveName}
      </Button>
      <Button onClick={onCancel}>Cancel</Button>
    </Box>
  );
}

const barSx = {
  display: 'flex',
  flexWrap: 'wrap',
  gap: 1,
  position: 'sticky',
  bottom: 0,
  py: 1.25,
  bgcolor: 'background.default',
  borderTop: '1px solid',
  borderColor: 'line.rule',
  zIndex: 2,
} as const;

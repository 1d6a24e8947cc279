import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import type { Part } from '../../api/types';
import { formatWhen } from '../../components/figures';
import { DifferenceList } from './DifferenceList';
import { differences } from './differences';

interface ConflictNoticeProps {
  /** The part as this form saw it. */
  base: Part;
  /** The part as somebody else left it meanwhile. */
  theirs: Part;
  onKeepMine: () => void;
  onTakeTheirs: () => void;
}

/** Says what changed meanwhile and lets the person decide; what they typed stays in the form until then. */
export function ConflictNotice({ base, theirs, onKeepMine, onTakeTheirs }: ConflictNoticeProps) {
  return (
    <Alert severity="warning" sx={{ mb: 1.5 }}>
      <Typography sx={{ fontWeight: 600 }}>
        {theirs.updatedBy} changed this part on {formatWhen(theirs.updatedAt)}, while you were editing.
      </Typography>
      <Typography sx={{ mb: 1 }}>
        Nothing of yours is saved yet, and nothing you typed is lost. Meanwhile:
      </Typography>
      <DifferenceList differences={differences(base, theirs)} />
      <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: 1, mt: 1.25 }}>
        <Button variant="outlined" onClick={onKeepMine}>
          Save mine over it
        </Button>
        <Button onClick={onTakeTheirs}>Drop mine and take theirs</Button>
      </Box>
    </Alert>
  );
}

import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { useEffect, useRef } from 'react';
import { DifferenceList, type Difference } from './DifferenceList';
import { formatWhen } from './figures';

interface ConflictNoticeProps {
  /** "this part" */
  what: string;
  /** As somebody else left it meanwhile. */
  theirs: { updatedAt: string; updatedBy: string };
  /** What they changed, against what this form began from. */
  differences: readonly Difference[];
  onKeepMine: () => void;
  onTakeTheirs: () => void;
}

/** Says what changed meanwhile and lets the person decide; what they typed stays in the form until then. */
export function ConflictNotice(props: ConflictNoticeProps) {
  const { what, theirs, differences, onKeepMine, onTakeTheirs } = props;
  const notice = useRef<HTMLDivElement>(null);
  // It stands at the head of a form whose button may be far below.
  useEffect(() => notice.current?.focus(), []);
  return (
    <Alert ref={notice} tabIndex={-1} severity="warning" sx={{ mb: 1.5, scrollMarginTop: 64 }}>
      <Typography sx={{ fontWeight: 600 }}>
        {theirs.updatedBy} changed {what} on {formatWhen(theirs.updatedAt)}, while you were editing.
      </Typography>
      <Typography sx={{ mb: 1 }}>
        Nothing of yours is saved yet, and nothing you typed is lost. Meanwhile:
      </Typography>
      <DifferenceList differences={differences} />
      <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: 1, mt: 1.25 }}>
        <Button variant="outlined" onClick={onKeepMine}>
          Save mine over it
        </Button>
        <Button onClick={onTakeTheirs}>Drop mine and take theirs</Button>
      </Box>
    </Alert>
  );
}

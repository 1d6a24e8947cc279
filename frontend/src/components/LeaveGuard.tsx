import Button from '@mui/material/Button';
import Dialog from '@mui/material/Dialog';
import DialogActions from '@mui/material/DialogActions';
import DialogContent from '@mui/material/DialogContent';
import DialogTitle from '@mui/material/DialogTitle';
import { useEffect } from 'react';
import { useBlocker } from 'react-router-dom';

interface LeaveGuardProps {
  /** True while something typed is not saved. */
  when: boolean;
  /** What would be lost: "this brief". */
  what: string;
}

/** Asks once before unsaved work is left behind, inside the app and when the window closes. */
export function LeaveGuard({ when, what }: LeaveGuardProps) {
  const blocker = useBlocker(when);
  useEffect(() => {
    if (!when) return undefined;
    const warn = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener('beforeunload', warn);
    return () => window.removeEventListener('beforeunload', warn);
  }, [when]);
  const blocked = blocker.state === 'blocked';
  return (
    <Dialog open={blocked} onClose={() => blocker.reset?.()} aria-labelledby="leave-title">
      <DialogTitle id="leave-title">Leave without saving?</DialogTitle>
      <DialogContent>What you changed in {what} is not saved yet and would be lost.</DialogContent>
      <DialogActions>
        <Button color="error" onClick={() => blocker.proceed?.()}>
          Leave and lose it
        </Button>
        <Button variant="contained" autoFocus onClick={() => blocker.reset?.()}>
          Stay here
        </Button>
      </DialogActions>
    </Dialog>
  );
}

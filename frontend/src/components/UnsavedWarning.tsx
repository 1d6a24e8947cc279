import Typography from '@mui/material/Typography';
import { useEffect } from 'react';
import { useBlocker } from 'react-router-dom';
import { ConfirmDialog } from './ConfirmDialog';

interface UnsavedWarningProps {
  dirty: boolean;
  what?: string;
  /** The search parameter of the address that opens the form, if one does: changing it leaves the form, too. */
  openedBy?: string;
}

/** Asks before unsaved changes are left behind: on a link inside the app, on reload and on closing the tab. */
export function UnsavedWarning({ dirty, what = 'this form', openedBy }: UnsavedWarningProps) {
  const blocker = useBlocker(
    ({ currentLocation, nextLocation }) =>
      dirty &&
      (currentLocation.pathname !== nextLocation.pathname ||
        (openedBy !== undefined &&
          parameter(currentLocation.search, openedBy) !== parameter(nextLocation.search, openedBy))),
  );
  useEffect(() => {
    if (!dirty) return undefined;
    const warn = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener('beforeunload', warn);
    return () => window.removeEventListener('beforeunload', warn);
  }, [dirty]);
  return (
    <ConfirmDialog
      open={blocker.state === 'blocked'}
      title="Leave without saving?"
      confirm="Leave and lose the changes"
      cancel="Stay here"
      danger
      onConfirm={() => blocker.proceed?.()}
      onCancel={() => blocker.reset?.()}
    >
      <Typography>What you changed in {what} is not saved yet.</Typography>
    </ConfirmDialog>
  );
}

const parameter = (search: string, name: string): string | null => new URLSearchParams(search).get(name);

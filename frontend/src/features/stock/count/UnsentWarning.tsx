import Typography from '@mui/material/Typography';
import { useEffect } from 'react';
import { useBlocker } from 'react-router-dom';
import { ConfirmDialog } from '../../../components/ConfirmDialog';

/** Says, before the page is left, that counts are not sent yet: they stay on the device, but nobody else sees them. */
export function UnsentWarning({ count }: { count: number }) {
  const blocker = useBlocker(
    ({ currentLocation, nextLocation }) => count > 0 && currentLocation.pathname !== nextLocation.pathname,
  );
  useEffect(() => {
    if (count === 0) return undefined;
    const warn = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener('beforeunload', warn);
    return () => window.removeEventListener('beforeunload', warn);
  }, [count]);
  return (
    <ConfirmDialog
      open={blocker.state === 'blocked'}
      title={count === 1 ? 'One count is not booked yet' : `${count} counts are not booked yet`}
      confirm="Leave"
      cancel="Stay here"
      onConfirm={() => blocker.proceed?.()}
      onCancel={() => blocker.reset?.()}
    >
      <Typography>
        {count === 1 ? 'It stays on this device. It is' : 'They stay on this device. They are'} sent when you
        open this page again with a network; until then the books do not know {count === 1 ? 'it' : 'them'}.
      </Typography>
    </ConfirmDialog>
  );
}

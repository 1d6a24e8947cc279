import Button from '@mui/material/Button';
import Dialog from '@mui/material/Dialog';
import DialogActions from '@mui/material/DialogActions';
import DialogContent from '@mui/material/DialogContent';
import DialogTitle from '@mui/material/DialogTitle';
import { useId, type ReactNode } from 'react';

interface ConfirmDialogProps {
  open: boolean;
  title: string;
  /** Names what will happen. */
  children: ReactNode;
  /** The act itself as the button's word: "Withdraw KW-00417". */
  confirm: string;
  cancel?: string;
  danger?: boolean;
  busy?: boolean;
  onConfirm: () => void;
  onCancel: () => void;
}

/** Asks once, naming what will happen. */
export function ConfirmDialog(props: ConfirmDialogProps) {
  const id = useId();
  return (
    <Dialog open={props.open} onClose={props.onCancel} aria-labelledby={id} fullWidth maxWidth="xs">
      <DialogTitle id={id}>{props.title}</DialogTitle>
      <DialogContent>{props.children}</DialogContent>
      <DialogActions>
        <Button onClick={props.onCancel}>{props.cancel ?? 'Cancel'}</Button>
        <Button
          variant="contained"
          color={props.danger ? 'error' : 'primary'}
          disabled={props.busy}
          onClick={props.onConfirm}
        >
          {props.confirm}
        </Button>
      </DialogActions>
    </Dialog>
  );
}

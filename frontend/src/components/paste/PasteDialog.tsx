import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Dialog from '@mui/material/Dialog';
import DialogActions from '@mui/material/DialogActions';
import DialogContent from '@mui/material/DialogContent';
import DialogTitle from '@mui/material/DialogTitle';
import { useTheme } from '@mui/material/styles';
import TextField from '@mui/material/TextField';
import Typography from '@mui/material/Typography';
import useMediaQuery from '@mui/material/useMediaQuery';
import { useId, useState, type ReactNode } from 'react';
import { ConfirmDialog } from '../ConfirmDialog';
import { LoadingRows } from '../LoadingRows';
import { useNotices } from '../Notices';
import { UnsavedWarning } from '../UnsavedWarning';
import { PasteHelp } from './PasteHelp';
import { PasteRows } from './PasteRows';
import type { PasteColumnsHelp } from './pasteTypes';
import { bookOffer } from './pasteWords';
import { usePaste, type PasteCalls } from './usePaste';

interface PasteDialogProps extends PasteCalls {
  title: string;
  columnsHelp: PasteColumnsHelp;
  /** Fields above the text that also decide what the rows mean, such as the supplier. */
  settings?: ReactNode;
  /** Changes with those fields: what was checked before no longer counts then. */
  settingsKey?: string;
  /** Why the rows cannot be checked yet, such as a supplier that is not chosen; null when they can. */
  notYet?: string | null;
  /** Something was booked: read again what shows it. */
  onBooked: () => void;
  onClose: () => void;
}

/**
 * Takes rows from a spreadsheet: paste, see row by row what would happen and what is wrong, then book. The text stays
 * whatever the server refuses, and rows that were left out stay to be mended.
 */
export function PasteDialog(props: PasteDialogProps) {
  const { title, columnsHelp, settings, settingsKey = '', notYet = null, onBooked, onClose } = props;
  const id = useId();
  const small = useMediaQuery(useTheme().breakpoints.down('sm'));
  const { tell } = useNotices();
  const paste = usePaste(props, settingsKey);
  const { text, preview, busy, remark } = paste;
  const [leaving, setLeaving] = useState(false);
  const blank = text.trim() === '';
  const offer = preview === null ? null : bookOffer(preview.rows);

  const book = async (leaveOutWrong: boolean) => {
    const booked = await paste.book(leaveOutWrong);
    if (booked === null) return;
    onBooked();
    if (booked.leftOut) return;
    tell(booked.said);
    onClose();
  };
  const leave = () => (blank ? onClose() : setLeaving(true));

  return (
    <Dialog open onClose={leave} fullWidth maxWidth="lg" fullScreen={small} aria-labelledby={id}>
      <UnsavedWarning dirty={!blank} what="the pasted rows" />
      <DialogTitle id={id}>{title}</DialogTitle>
      <DialogContent>
        {settings !== undefined && <Box sx={{ mb: 1.5 }}>{settings}</Box>}
        <PasteHelp help={columnsHelp} open={blank && preview === null && remark === null} />
        <TextField
          label="Rows from the spreadsheet"
          multiline
          rows={preview === null ? 8 : 4}
          fullWidth
          value={text}
          autoFocus={settings === undefined}
          onChange={(event) => paste.setText(event.target.value)}
          onPaste={(event) => {
            const pasted = event.clipboardData.getData('text');
            // Into an empty box: checked at once. Anything else waits for the button.
            if (!blank || pasted.trim() === '' || notYet !== null) return;
            event.preventDefault();
            paste.setText(pasted);
            void paste.check(pasted);
          }}
          placeholder="Paste here"
          slotProps={{
            htmlInput: { wrap: 'off', spellCheck: false, style: { tabSize: 14, overflow: 'auto' } },
          }}
        />
        <Box aria-live="polite" sx={{ mt: 1 }}>
          {remark !== null && <Alert severity={remark.severity}>{remark.message}</Alert>}
          {busy === 'preview' && <LoadingRows rows={4} label="Checking the rows" />}
          {busy !== 'preview' && offer !== null && offer.why !== null && (
            <Typography sx={{ mt: 1 }}>{offer.why}</Typography>
          )}
          {busy === null && preview === null && !blank && remark === null && (
            <Typography color="textSecondary">
              {notYet ?? 'Check the rows to see what would happen; nothing is booked by that.'}
            </Typography>
          )}
        </Box>
        {preview !== null && busy !== 'preview' && <PasteRows key={paste.previewKey} preview={preview} />}
      </DialogContent>
      <DialogActions>
        <Button onClick={leave}>{blank ? 'Close' : 'Cancel'}</Button>
        {offer === null || offer.why !== null ? (
          <Button
            variant="contained"
            disabled={blank || notYet !== null || (offer !== null && offer.why !== null)}
            loading={busy === 'preview'}
            onClick={() => void paste.check()}
          >
            Check the rows
          </Button>
        ) : (
          <Button
            variant="contained"
            loading={busy === 'book'}
            onClick={() => void book(offer.leaveOutWrong)}
          >
            {offer.name}
          </Button>
        )}
      </DialogActions>
      <ConfirmDialog
        open={leaving}
        title="Leave without booking?"
        confirm="Leave and lose the rows"
        cancel="Stay here"
        danger
        onConfirm={onClose}
        onCancel={() => setLeaving(false)}
      >
        <Typography>The rows in the box are not booked.</Typography>
      </ConfirmDialog>
    </Dialog>
  );
}

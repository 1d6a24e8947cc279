import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import TextField from '@mui/material/TextField';
import Typography from '@mui/material/Typography';
import { useState, type FormEvent } from 'react';
import { saveTrain } from '../../../api/hooks/useTrain';
import type { Train } from '../../../api/types';
import { FigureTable } from '../../../components/FigureTable';
import { formatWhen } from '../../../components/figures';
import { useNotices } from '../../../components/Notices';
import { Sheet } from '../../../components/Sheet';
import { UnsavedWarning } from '../../../components/UnsavedWarning';
import { useTrainSaving } from '../useTrainSaving';
import { ChangesList } from './ChangesList';

/** Title, note, revision and everything that was changed. */
export function RecordTab({ train, canEdit }: { train: Train; canEdit: boolean }) {
  return (
    <Box
      sx={{
        display: 'grid',
        gridTemplateColumns: { xs: 'minmax(0, 1fr)', lg: 'minmax(0, 1fr) 320px' },
        gap: 2,
        alignItems: 'start',
      }}
    >
      <Box sx={{ display: 'grid', gap: 2, minWidth: 0 }}>
        {canEdit ? (
          <RecordForm train={train} />
        ) : (
          <Sheet title="Note">
            <Typography sx={{ whiteSpace: 'pre-line' }}>
              {train.note === '' ? 'No note.' : train.note}
            </Typography>
          </Sheet>
        )}
        <ChangesList code={train.code} />
      </Box>
      <Sheet title={`Revision ${train.revision}`} flush>
        <FigureTable
          label={`Revision ${train.revision}`}
          rows={[
            { label: 'State', values: [train.state] },
            { label: 'Owner', values: [train.owner] },
            { label: 'Adopted', values: [formatWhen(train.createdAt)] },
            { label: 'Last changed', values: [formatWhen(train.updatedAt)] },
            { label: 'Version', values: [train.version] },
          ]}
        />
      </Sheet>
    </Box>
  );
}

function RecordForm({ train }: { train: Train }) {
  const [title, setTitle] = useState(train.title);
  const [note, setNote] = useState(train.note);
  const [began, setBegan] = useState({ title: train.title, note: train.note });
  const saving = useTrainSaving();
  const { tell } = useNotices();
  const dirty = title !== began.title || note !== began.note;
  const issueOf = (field: string) => saving.issues.find((issue) => issue.field === field)?.message;

  async function submit(event: FormEvent): Promise<void> {
    event.preventDefault();
    const patch = { version: train.version, title: title.trim(), note };
    const saved = await saving.run(() => saveTrain(train.code, patch));
    if (!saved) return;
    setBegan({ title: saved.title, note: saved.note });
    setTitle(saved.title);
    setNote(saved.note);
    tell(`${saved.code} saved.`);
  }

  return (
    <Sheet>
      <UnsavedWarning dirty={dirty} what="the record of this train" openedBy="tab" />
      <form noValidate onSubmit={(event) => void submit(event)}>
        {saving.problem !== null && (
          <Alert severity="error" sx={{ mb: 1.5 }}>
            {saving.problem}
          </Alert>
        )}
        <Box sx={{ display: 'grid', gap: 1.5 }}>
          <TextField
            id="train-title"
            label="Title"
            value={title}
            onChange={(event) => setTitle(event.target.value)}
            error={issueOf('title') !== undefined}
            helperText={issueOf('title')}
            fullWidth
          />
          <TextField
            id="train-note"
            label="Note"
            value={note}
            onChange={(event) => setNote(event.target.value)}
            error={issueOf('note') !== undefined}
            helperText={issueOf('note')}
            multiline
            minRows={3}
            fullWidth
          />
          <Box sx={{ display: 'flex', gap: 1, justifyContent: 'flex-end' }}>
            {dirty && (
              <Button
                onClick={() => {
                  setTitle(began.title);
                  setNote(began.note);
                  saving.clear();
                }}
              >
                Discard
              </Button>
            )}
            <Button type="submit" variant="contained" disabled={!dirty} loading={saving.busy}>
              Save
            </Button>
          </Box>
        </Box>
      </form>
    </Sheet>
  );
}

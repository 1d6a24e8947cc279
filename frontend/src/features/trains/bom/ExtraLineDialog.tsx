import Alert from '@mui/material/Alert';
import Autocomplete from '@mui/material/Autocomplete';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Dialog from '@mui/material/Dialog';
import DialogActions from '@mui/material/DialogActions';
import DialogContent from '@mui/material/DialogContent';
import DialogTitle from '@mui/material/DialogTitle';
import MenuItem from '@mui/material/MenuItem';
import TextField from '@mui/material/TextField';
import { useId, useState, type FormEvent } from 'react';
import { saveExtraLines } from '../../../api/hooks/useBomEdits';
import { useFinder } from '../../../api/hooks/useFinder';
import type { ExtraLine, Train } from '../../../api/types';
import { useNotices } from '../../../components/Notices';
import { UnsavedWarning } from '../../../components/UnsavedWarning';
import { useTrainSaving } from '../useTrainSaving';
import { formOfLine, lineOfForm, type ExtraLineForm } from './extraLineForm';

interface ExtraLineDialogProps {
  train: Train;
  /** Every added line as it is kept. */
  extraLines: readonly ExtraLine[];
  /** Under change; null: a new one. */
  line: ExtraLine | null;
  onClose: () => void;
}

const UNITS = ['pcs', 'l', 'm'] as const;

/** A line that a person adds to the bill: a part of the library, or something without a number yet. */
export function ExtraLineDialog({ train, extraLines, line, onClose }: ExtraLineDialogProps) {
  const id = useId();
  const [began] = useState(() => formOfLine(line));
  const [form, setForm] = useState(began);
  const [wrong, setWrong] = useState<Partial<Record<keyof ExtraLineForm, string>>>({});
  const saving = useTrainSaving();
  const { tell } = useNotices();
  const set = (field: keyof ExtraLineForm) => (value: string) => {
    setForm((before) => ({ ...before, [field]: value }));
    setWrong((before) => ({ ...before, [field]: undefined }));
  };
  const at = line === null ? extraLines.length : extraLines.findIndex((each) => each.id === line.id);
  const issueOf = (field: keyof ExtraLineForm) =>
    wrong[field] ?? saving.issues.find((issue) => issue.field === `lines.${at}.${field}`)?.message;
  const homeless = saving.issues.filter(({ field }) => !field.startsWith(`lines.${at}.`));

  async function save(event: FormEvent): Promise<void> {
    event.preventDefault();
    const reading = lineOfForm(form, line?.id ?? null);
    setWrong(reading.wrong);
    if (reading.line === null) return;
    const { line: typed } = reading;
    const lines =
      line === null
        ? [...extraLines, typed]
        : extraLines.map((each) => (each.id === line.id ? { ...typed, id: line.id } : each));
    const saved = await saving.run(() => saveExtraLines(train.code, train.version, lines));
    if (!saved) return;
    tell(line === null ? 'Line added.' : 'Line changed.');
    onClose();
  }

  const field = (name: keyof ExtraLineForm) => ({
    value: form[name],
    onChange: (event: { target: { value: string } }) => set(name)(event.target.value),
    error: issueOf(name) !== undefined,
    helperText: issueOf(name),
    fullWidth: true,
    autoComplete: 'off',
  });
  return (
    <Dialog open onClose={onClose} fullWidth maxWidth="sm" aria-labelledby={id}>
      <UnsavedWarning dirty={JSON.stringify(form) !== JSON.stringify(began)} what="this line" />
      <form noValidate onSubmit={(event) => void save(event)}>
        <DialogTitle id={id}>{line === null ? 'Add a line' : 'Change an added line'}</DialogTitle>
        <DialogContent>
          {saving.problem !== null && (saving.issues.length === 0 || homeless.length > 0) && (
            <Alert severity="error" sx={{ mb: 1.5 }}>
              {[saving.problem, ...homeless.map(({ message }) => message)].join(' ')}
            </Alert>
          )}
          <Box sx={{ display: 'grid', gridTemplateColumns: { xs: '1fr', sm: '1fr 110px 90px' }, gap: 1.5 }}>
            <PartNumberField
              value={form.partNumber}
              onChange={set('partNumber')}
              problem={issueOf('partNumber')}
            />
            <TextField
              {...field('quantity')}
              id={`${id}-quantity`}
              label="Quantity in each"
              required
              slotProps={{ htmlInput: { inputMode: 'decimal', className: 'number', maxLength: 20 } }}
            />
            <TextField {...field('unit')} id={`${id}-unit`} label="Unit" select>
              {UNITS.map((unit) => (
                <MenuItem key={unit} value={unit}>
                  {unit}
                </MenuItem>
              ))}
            </TextField>
            <Box sx={{ gridColumn: '1 / -1', display: 'grid', gap: 1.5 }}>
              <TextField {...field('description')} id={`${id}-description`} label="Description" />
              <TextField {...field('note')} id={`${id}-note`} label="Note" />
            </Box>
          </Box>
        </DialogContent>
        <DialogActions>
          <Button onClick={onClose}>Cancel</Button>
          <Button type="submit" variant="contained" loading={saving.busy}>
            {line === null ? 'Add the line' : 'Save the line'}
          </Button>
        </DialogActions>
      </form>
    </Dialog>
  );
}

interface PartNumberFieldProps {
  value: string;
  onChange: (number: string) => void;
  problem: string | undefined;
}

/** A part of the library, found by number or words; may stay blank. */
function PartNumberField({ value, onChange, problem }: PartNumberFieldProps) {
  const { found, isLoading } = useFinder(value);
  return (
    <Autocomplete
      freeSolo
      options={found?.parts ?? []}
      getOptionLabel={(hit) => (typeof hit === 'string' ? hit : hit.number)}
      filterOptions={(all) => all}
      inputValue={value}
      onInputChange={(_, text) => onChange(text)}
      loading={isLoading}
      renderOption={({ key, ...props }, hit) => (
        <li key={key} {...props}>
          <span className="part-number">{hit.number}</span>&ensp;{hit.description}
        </li>
      )}
      renderInput={(params) => (
        <TextField
          {...params}
          label="Part number"
          error={problem !== undefined}
          helperText={problem ?? 'Blank for something without a number yet'}
        />
      )}
    />
  );
}

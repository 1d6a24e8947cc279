import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import TableBody from '@mui/material/TableBody';
import TableCell from '@mui/material/TableCell';
import TableHead from '@mui/material/TableHead';
import TableRow from '@mui/material/TableRow';
import TextField from '@mui/material/TextField';
import { useState, type FormEvent } from 'react';
import type { Train } from '../../../api/types';
import { CopyTable } from '../../../components/CopyTable';
import { formatFixed, formatPlain } from '../../../components/figures';
import { Sheet } from '../../../components/Sheet';
import { UnsavedWarning } from '../../../components/UnsavedWarning';
import { useShaftForm } from './useShaftForm';

const BASIS_WORDS: Record<Train['spec']['shafts'][number]['basis'], string> = {
  torque: 'from its torque',
  bore: 'from a stock bore',
  start: 'a first guess',
  typed: 'chosen',
};

/** `Shaft 0, input`: the number that the drawing, the checks and the bill of materials go by. */
const shaftName = (index: number, count: number): string =>
  `Shaft ${index}${index === 0 ? ', input' : index === count - 1 ? ', output' : ''}`;

/** Speed, torque and diameter of every shaft; the diameter can be chosen. */
export function ShaftsTable({ train, canEdit }: { train: Train; canEdit: boolean }) {
  const [editing, setEditing] = useState(false);
  const form = useShaftForm(train, () => setEditing(false));
  const { shafts } = train.figures;

  async function submit(event: FormEvent): Promise<void> {
    event.preventDefault();
    await form.save();
  }

  return (
    <Sheet
      title="Shafts"
      flush
      aside={
        canEdit &&
        !editing && (
          <Button variant="text" onClick={() => setEditing(true)} sx={{ displayPrint: 'none' }}>
            Change diameters
          </Button>
        )
      }
    >
      <UnsavedWarning dirty={editing && form.dirty} what="the shaft diameters" openedBy="tab" />
      <form onSubmit={(event) => void submit(event)} noValidate>
        {form.problem !== null && (
          <Alert severity="error" sx={{ mx: 1.75, mb: 1 }}>
            {form.problem}
          </Alert>
        )}
        <Box sx={{ overflowX: 'auto' }}>
          <CopyTable label="Shafts">
            <TableHead>
              <TableRow>
                <TableCell>Shaft</TableCell>
                <TableCell>Turns</TableCell>
                <TableCell align="right">Speed, rpm</TableCell>
                <TableCell align="right">Torque, N·m</TableCell>
                <TableCell align="right">Power, kW</TableCell>
                <TableCell align="right">Least diameter, mm</TableCell>
                <TableCell align="right">Diameter, mm</TableCell>
              </TableRow>
            </TableHead>
            <TableBody>
              {shafts.map((shaft) => {
                const chosen = train.spec.shafts[shaft.index];
                const issue = form.issues[shaft.index];
                return (
                  <TableRow key={shaft.index}>
                    <TableCell component="th" scope="row" sx={{ whiteSpace: 'nowrap' }}>
                      {shaftName(shaft.index, shafts.length)}
                    </TableCell>
                    <TableCell sx={{ whiteSpace: 'nowrap' }}>
                      {shaft.direction === 1 ? 'with the input' : 'against it'}
                    </TableCell>
                    <TableCell align="right">{formatFixed(shaft.speed, 1)}</TableCell>
                    <TableCell align="right">{formatFixed(shaft.torque, 2)}</TableCell>
                    <TableCell align="right">{formatFixed(shaft.power, 3)}</TableCell>
                    <TableCell align="right">{formatPlain(shaft.leastDiameter, 1)}</TableCell>
                    <TableCell align="right" sx={{ whiteSpace: 'nowrap' }}>
                      {editing ? (
                        <TextField
                          value={form.typed[shaft.index] ?? ''}
                          onChange={(event) => form.type(shaft.index, event.target.value)}
                          error={issue !== undefined}
                          helperText={issue}
                          slotProps={{
                            htmlInput: {
                              'aria-label': `${shaftName(shaft.index, shafts.length)}: diameter, mm`,
                              inputMode: 'decimal',
                              className: 'number',
                            },
                          }}
                          sx={{ width: issue ? 240 : 110 }}
                        />
                      ) : (
                        <>
                          {formatPlain(chosen?.diameter, 2)}
                          {chosen && (
                            <Box
                              component="span"
                              sx={{ color: 'text.secondary', ml: 1, fontSize: '0.75rem' }}
                            >
                              {BASIS_WORDS[chosen.basis]}
                            </Box>
                          )}
                        </>
                      )}
                    </TableCell>
                  </TableRow>
                );
              })}
            </TableBody>
          </CopyTable>
        </Box>
        {editing && (
          <Box sx={{ display: 'flex', gap: 1, justifyContent: 'flex-end', px: 1.75, py: 1.25 }}>
            <Button
              onClick={() => {
                form.reset();
                setEditing(false);
              }}
            >
              Cancel
            </Button>
            <Button type="submit" variant="contained" loading={form.saving}>
              Save diameters
            </Button>
          </Box>
        )}
      </form>
    </Sheet>
  );
}

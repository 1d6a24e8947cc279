import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import TableBody from '@mui/material/TableBody';
import TableCell from '@mui/material/TableCell';
import TableHead from '@mui/material/TableHead';
import TableRow from '@mui/material/TableRow';
import Typography from '@mui/material/Typography';
import { CopyTable } from '../../../components/CopyTable';
import { formatWhen } from '../../../components/figures';
import type { Meanwhile } from './useBriefForm';

interface MeanwhilePanelProps {
  meanwhile: Meanwhile;
  onTakeTheirs: () => void;
  onKeepMine: () => void;
}

/** Somebody saved in between: what they changed, beside what is typed here, and the two ways on. */
export function MeanwhilePanel({ meanwhile, onTakeTheirs, onKeepMine }: MeanwhilePanelProps) {
  const { saved, changes } = meanwhile;
  return (
    <Box
      role="alert"
      sx={{ bgcolor: 'background.paper', border: '1px solid', borderColor: 'warning.main', p: 2, mb: 1.5 }}
    >
      <Typography variant="h2">This brief was saved by somebody else while you were typing</Typography>
      <Typography color="textSecondary" sx={{ mb: 1 }}>
        Saved {formatWhen(saved.updatedAt)}. Nothing you typed is lost.
        {changes.length === 0 && ' They changed no field of this form.'}
      </Typography>
      {changes.length > 0 && (
        <Box sx={{ overflowX: 'auto' }}>
          <CopyTable label="Changed meanwhile">
            <TableHead>
              <TableRow>
                <TableCell>Field</TableCell>
                <TableCell>Before</TableCell>
                <TableCell>Theirs</TableCell>
                <TableCell>Yours</TableCell>
              </TableRow>
            </TableHead>
            <TableBody>
              {changes.map((change) => (
                <TableRow key={change.field}>
                  <TableCell>{change.label}</TableCell>
                  <TableCell>{change.before || 'blank'}</TableCell>
                  <TableCell>{change.theirs || 'blank'}</TableCell>
                  <TableCell>
                    {change.mine || 'blank'}
                    {change.contested && ' (both changed)'}
                  </TableCell>
                </TableRow>
              ))}
            </TableBody>
          </CopyTable>
        </Box>
      )}
      <Box sx={{ display: 'flex', gap: 1, mt: 1.5, flexWrap: 'wrap' }}>
        <Button variant="outlined" onClick={onTakeTheirs}>
          Take their changes, keep my others
        </Button>
        <Button variant="outlined" onClick={onKeepMine}>
          Save mine over theirs
        </Button>
      </Box>
    </Box>
  );
}

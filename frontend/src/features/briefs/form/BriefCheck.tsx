import Box from '@mui/material/Box';
import ButtonBase from '@mui/material/ButtonBase';
import Typography from '@mui/material/Typography';
import type { Hint } from '../hints/hint';
import { FIELD_NAMES } from './fieldNames';
import { focusField } from './useBriefForm';

/** Every remark in one place beside the form; each leads to its field. */
export function BriefCheck({ remarks }: { remarks: readonly Hint[] }) {
  const crossed = remarks.filter(({ kind }) => kind === 'crossed');
  const notes = remarks.filter(({ kind }) => kind === 'note');
  return (
    <Box
      component="aside"
      aria-label="Check of the brief"
      aria-live="polite"
      sx={{ position: { md: 'sticky' }, top: 68, alignSelf: 'start' }}
    >
      {remarks.length === 0 && (
        <Typography variant="body2" color="textSecondary">
          Nothing in this brief crosses a limit.
        </Typography>
      )}
      {crossed.length > 0 && <Remarks title="Cannot be met" colour="error.main" remarks={crossed} />}
      {notes.length > 0 && <Remarks title="Worth knowing" colour="text.primary" remarks={notes} />}
    </Box>
  );
}

function Remarks({ title, colour, remarks }: { title: string; colour: string; remarks: readonly Hint[] }) {
  return (
    <Box sx={{ mb: 2 }}>
      <Typography variant="h2" sx={{ color: colour, mb: 0.5 }}>
        {title}
      </Typography>
      {remarks.map((remark) => (
        <ButtonBase
          key={remark.field + remark.message}
          onClick={() => focusField(remark.field)}
          sx={{
            display: 'block',
            width: '100%',
            textAlign: 'left',
            py: 0.75,
            borderTop: '1px solid',
            borderColor: 'line.rule',
            font: 'inherit',
            '&:hover': { bgcolor: 'wash.hover' },
          }}
        >
          <Typography variant="body2" component="span" sx={{ fontWeight: 600, display: 'block' }}>
            {FIELD_NAMES[remark.field].label}
          </Typography>
          <Typography variant="body2" component="span" color="textSecondary">
            {remark.message}
          </Typography>
        </ButtonBase>
      ))}
    </Box>
  );
}

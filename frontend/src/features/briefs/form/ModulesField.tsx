import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Chip from '@mui/material/Chip';
import TextField from '@mui/material/TextField';
import Typography from '@mui/material/Typography';
import { formatTrimmed, moduleToDiametralPitch } from '@stageyard/libs/units';
import { useState, type KeyboardEvent } from 'react';
import { useController, useFormContext } from 'react-hook-form';
import { readDecimal } from '../../../components/decimalText';
import type { BriefForm } from './briefForm';
import { SERIES_ONE, SERIES_TWO, seriesOf } from './isoModules';
import { FieldRemarks, useRemarks } from './remarks';

/** Modules as switches from the ISO 54 rows, any other by typing; each with its diametral pitch. */
export function ModulesField() {
  const { control } = useFormContext<BriefForm>();
  const { field } = useController({ control, name: 'modules' });
  const [showSecond, setShowSecond] = useState(false);
  const [typed, setTyped] = useState('');
  const [refused, setRefused] = useState<string | null>(null);
  const remarks = useRemarks('modules');
  const chosen = field.value;

  const toggle = (module: number) =>
    field.onChange(
      chosen.includes(module)
        ? chosen.filter((other) => other !== module)
        : [...chosen, module].sort((a, b) => a - b),
    );

  const add = () => {
    const reading = readDecimal(typed);
    if (reading.kind === 'blank') return;
    if (reading.kind === 'problem') return setRefused(reading.message);
    if (reading.value < 0.1 || reading.value > 50) {
      return setRefused(`Module ${reading.text} mm is outside 0.1 to 50 mm.`);
    }
    if (!chosen.includes(reading.value)) toggle(reading.value);
    setTyped('');
    setRefused(null);
  };

  const others = chosen.filter((module) => seriesOf(module) === 'none');
  const secondShown = showSecond || chosen.some((module) => seriesOf(module) === 'II');
  const offered = [...SERIES_ONE, ...(secondShown ? SERIES_TWO : []), ...others].sort((a, b) => a - b);

  return (
    <div role="group" aria-labelledby="modules-label">
      <Typography
        id="modules-label"
        variant="body2"
        sx={{ fontWeight: 500, color: 'text.secondary', mb: 0.5 }}
      >
        Modules, mm
      </Typography>
      <Box
        id="brief-modules"
        tabIndex={-1}
        sx={{ display: 'flex', flexWrap: 'wrap', gap: 0.5, outline: 'none' }}
      >
        {offered.map((module) => {
          const on = chosen.includes(module);
          const pitch = formatTrimmed(moduleToDiametralPitch(module), 2);
          return (
            <Chip
              key={module}
              label={formatTrimmed(module, 4)}
              onClick={() => toggle(module)}
              variant="outlined"
              aria-pressed={on}
              aria-label={`Module ${module} mm, diametral pitch ${pitch}`}
              title={`DP ${pitch}`}
              sx={{
                minWidth: 44,
                color: on ? 'text.primary' : 'text.secondary',
                fontWeight: on ? 600 : 400,
                borderColor: on ? 'secondary.main' : 'line.rule',
                bgcolor: on ? 'wash.brass' : 'transparent',
                '&&:hover': { bgcolor: on ? 'wash.brass' : 'wash.hover' },
              }}
            />
          );
        })}
        {!secondShown && (
          <Button
            variant="text"
            onClick={() => setShowSecond(true)}
            sx={{ minHeight: 24, py: 0, fontWeight: 500 }}
          >
            Second series
          </Button>
        )}
      </Box>
      <Box sx={{ display: 'flex', gap: 1, mt: 1, alignItems: 'flex-start', flexWrap: 'wrap' }}>
        <TextField
          value={typed}
          onChange={(event) => setTyped(event.target.value)}
          onKeyDown={(event: KeyboardEvent) => {
            if (event.key !== 'Enter') return;
            event.preventDefault();
            add();
          }}
          placeholder="Another module"
          error={refused !== null}
          helperText={refused}
          slotProps={{ htmlInput: { 'aria-label': 'Another module, mm', inputMode: 'decimal' } }}
          sx={{ width: 150 }}
        />
        <Button variant="outlined" onClick={add}>
          Add
        </Button>
        <Typography variant="body2" color="textSecondary" sx={{ alignSelf: 'center' }}>
          {chosen.length === 0
            ? 'None chosen'
            : chosen
                .map((m) => `m ${formatTrimmed(m, 4)} = DP ${formatTrimmed(moduleToDiametralPitch(m), 2)}`)
                .join(' · ')}
        </Typography>
      </Box>
      <FieldRemarks id="remarks-modules" remarks={remarks} />
    </div>
  );
}

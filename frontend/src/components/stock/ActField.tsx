import ToggleButton from '@mui/material/ToggleButton';
import ToggleButtonGroup from '@mui/material/ToggleButtonGroup';
import { useController, type Control } from 'react-hook-form';
import type { MovementKind } from '../../api/types';
import type { MovementForm } from './movementForm';
import { ACT_NAMES, MOVEMENT_KINDS } from './stockWords';

/** What is done to the shelf; the rest of the form keeps what was typed. */
export function ActField({ control }: { control: Control<MovementForm> }) {
  const { field } = useController({ control, name: 'kind' });
  return (
    <ToggleButtonGroup
      exclusive
      fullWidth
      aria-label="What is done"
      value={field.value}
      onChange={(_, kind: MovementKind | null) => {
        if (kind !== null) field.onChange(kind);
      }}
    >
      {MOVEMENT_KINDS.map((kind) => (
        <ToggleButton key={kind} value={kind}>
          {ACT_NAMES[kind]}
        </ToggleButton>
      ))}
    </ToggleButtonGroup>
  );
}

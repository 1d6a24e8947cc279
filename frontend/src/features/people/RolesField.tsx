import Checkbox from '@mui/material/Checkbox';
import FormControl from '@mui/material/FormControl';
import FormControlLabel from '@mui/material/FormControlLabel';
import FormHelperText from '@mui/material/FormHelperText';
import FormLabel from '@mui/material/FormLabel';
import { useController, type Control } from 'react-hook-form';
import type { Role } from '../../api/types';
import type { PersonForm } from './PersonDialog';
import { ROLES } from './roleNames';

/** One or more roles, each with what it gives. */
export function RolesField({ control }: { control: Control<PersonForm> }) {
  const { field, fieldState } = useController({
    control,
    name: 'roles',
    rules: { validate: (roles) => roles.length > 0 || 'Choose at least one role.' },
  });
  const toggle = (role: Role, on: boolean) =>
    field.onChange(on ? [...field.value, role] : field.value.filter((each) => each !== role));
  return (
    <FormControl component="fieldset" error={fieldState.error !== undefined}>
      <FormLabel component="legend" sx={{ fontSize: '0.8125rem', fontWeight: 500 }}>
        Roles
      </FormLabel>
      {ROLES.map(({ role, name, does }) => (
        <FormControlLabel
          key={role}
          control={
            <Checkbox
              checked={field.value.includes(role)}
              onChange={(event) => toggle(role, event.target.checked)}
              onBlur={field.onBlur}
            />
          }
          label={`${name}: ${does}`}
        />
      ))}
      {fieldState.error !== undefined && <FormHelperText>{fieldState.error.message}</FormHelperText>}
    </FormControl>
  );
}

import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { useState } from 'react';
import type { Control, UseFormSetValue } from 'react-hook-form';
import { TextInput } from '../../components/TextInput';
import type { PersonForm } from './PersonDialog';
import { suggestPassword } from './suggestPassword';

interface PasswordFieldProps {
  control: Control<PersonForm>;
  setValue: UseFormSetValue<PersonForm>;
  /** A new person needs one; for a known one a blank field leaves theirs alone. */
  first: boolean;
}

/** The password that an administrator gives; it can be made up and read before it is handed over. */
export function PasswordField({ control, setValue, first }: PasswordFieldProps) {
  const [seen, setSeen] = useState(false);
  const suggest = () => {
    setValue('password', suggestPassword(), { shouldDirty: true, shouldValidate: true });
    setSeen(true);
  };
  return (
    <Box>
      <TextInput
        control={control}
        name="password"
        label={first ? 'First password' : 'New password'}
        type={seen ? 'text' : 'password'}
        autoComplete="new-password"
        required={first}
        least={10}
        most={200}
        hint={
          first
            ? 'At least 10 characters. Hand it over yourself; it is not shown again.'
            : 'Blank: stays as it is. A new one signs this person out everywhere.'
        }
      />
      <Button onClick={suggest} sx={{ ml: -1 }}>
        Suggest one
      </Button>
      <Button onClick={() => setSeen(!seen)} aria-pressed={seen}>
        {seen ? 'Hide it' : 'Show it'}
      </Button>
    </Box>
  );
}

import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Dialog from '@mui/material/Dialog';
import DialogActions from '@mui/material/DialogActions';
import DialogContent from '@mui/material/DialogContent';
import DialogTitle from '@mui/material/DialogTitle';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { answer, api } from '../../api/client';
import { asProblem } from '../../api/problem';
import type { Role, User } from '../../api/types';
import { applyProblem } from '../../components/applyProblem';
import { TextInput } from '../../components/TextInput';
import { RolesField } from './RolesField';

export interface PersonForm {
  name: string;
  email: string;
  password: string;
  roles: Role[];
}

const FIELDS: readonly string[] = ['name', 'email', 'password', 'roles'];

interface PersonDialogProps {
  /** null: a new person. */
  person: User | null;
  onClose: () => void;
  onSaved: () => void;
}

/** Adds or changes a person; what was typed stays when the server refuses. */
export function PersonDialog({ person, onClose, onSaved }: PersonDialogProps) {
  const [refusal, setRefusal] = useState<string | null>(null);
  const [version, setVersion] = useState(person?.version ?? 0);
  const { control, handleSubmit, setError, formState } = useForm<PersonForm>({
    defaultValues: {
      name: person?.name ?? '',
      email: person?.email ?? '',
      password: '',
      roles: person?.roles ?? [],
    },
  });

  const save = async (form: PersonForm) => {
    setRefusal(null);
    try {
      if (person === null) {
        await answer(api.POST('/api/users', { body: form }));
      } else {
        const { password, ...rest } = form;
        const body = { version, ...rest, ...(password === '' ? {} : { password }) };
        await answer(api.PATCH('/api/users/{id}', { params: { path: { id: person.id } }, body }));
      }
      onSaved();
    } catch (error) {
      const problem = asProblem(error);
      if (problem.changedMeanwhile) {
        const theirs = problem.current as User;
        setVersion(theirs.version);
        setRefusal(
          `Somebody changed this person meanwhile: now ${theirs.name}, ${theirs.email}, ${theirs.roles.join(', ')}. Save again to put yours in its place.`,
        );
        return;
      }
      const fieldOf = (path: string) => {
        const name = path.split('.')[0] ?? '';
        return FIELDS.includes(name) ? (name as keyof PersonForm) : null;
      };
      setRefusal(applyProblem(problem, setError, fieldOf));
    }
  };

  return (
    <Dialog open onClose={onClose} fullWidth maxWidth="xs" aria-labelledby="person-dialog">
      <form noValidate onSubmit={(event) => void handleSubmit(save)(event)}>
        <DialogTitle id="person-dialog">
          {person === null ? 'Add a person' : `Edit ${person.name}`}
        </DialogTitle>
        <DialogContent>
          <Box sx={{ display: 'flex', flexDirection: 'column', gap: 1.5 }}>
            {refusal !== null && <Alert severity="error">{refusal}</Alert>}
            <TextInput control={control} name="name" label="Name" required most={120} autoFocus />
            <TextInput control={control} name="email" label="E-mail address" type="email" required />
            <TextInput
              control={control}
              name="password"
              label={person === null ? 'First password' : 'New password'}
              type="password"
              autoComplete="new-password"
              required={person === null}
              hint={
                person === null ? 'At least 10 characters; hand it over in person.' : 'Blank: stays as it is.'
              }
            />
            <RolesField control={control} />
          </Box>
        </DialogContent>
        <DialogActions>
          <Button onClick={onClose}>Cancel</Button>
          <Button type="submit" variant="contained" disabled={formState.isSubmitting}>
            {person === null ? 'Add' : 'Save'}
          </Button>
        </DialogActions>
      </form>
    </Dialog>
  );
}

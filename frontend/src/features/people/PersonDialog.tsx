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
import { PasswordField } from './PasswordField';
import { RolesField } from './RolesField';
import { roleWords } from './roleNames';

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
  /** Gets what to say about it. */
  onSaved: (message: string) => void;
}

/** Adds or changes a person; what was typed stays when the server refuses. */
export function PersonDialog({ person, onClose, onSaved }: PersonDialogProps) {
  const [refusal, setRefusal] = useState<string | null>(null);
  const [version, setVersion] = useState(person?.version ?? 0);
  const { control, handleSubmit, setError, setValue, formState } = useForm<PersonForm>({
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
        const added = await answer(api.POST('/api/users', { body: form }));
        onSaved(`${added.name} can now sign in at ${window.location.origin} with the first password.`);
      } else {
        const { password, ...rest } = form;
        const body = { version, ...rest, ...(password === '' ? {} : { password }) };
        const path = { id: person.id };
        const after = await answer(api.PATCH('/api/users/{id}', { params: { path }, body }));
        onSaved(`${after.name} saved.`);
      }
    } catch (error) {
      const problem = asProblem(error);
      if (problem.changedMeanwhile) {
        const theirs = problem.current as User;
        setVersion(theirs.version);
        setRefusal(
          `Somebody changed this person meanwhile: now ${theirs.name}, ${theirs.email}, ${roleWords(theirs.roles)}. Save again to put yours in its place.`,
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
            <RolesField control={control} />
            <PasswordField control={control} setValue={setValue} first={person === null} />
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

import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { useSWRConfig } from 'swr';
import { answer, api } from '../../api/client';
import { ME_KEY } from '../../api/hooks/useMe';
import { asProblem } from '../../api/problem';
import { applyProblem } from '../../components/applyProblem';
import { TextInput } from '../../components/TextInput';
import { OpeningPage } from './OpeningPage';

interface InviteForm {
  name: string;
  email: string;
  password: string;
}

const FIELDS: readonly string[] = ['name', 'email', 'password'];

/** Makes the first administrator from the one-time link that the server printed. */
export default function AcceptInvitePage() {
  const navigate = useNavigate();
  const [params] = useSearchParams();
  const { mutate } = useSWRConfig();
  const token = params.get('token') ?? '';
  const [refusal, setRefusal] = useState<string | null>(null);
  const { control, handleSubmit, setError, formState } = useForm<InviteForm>({
    defaultValues: { name: '', email: '', password: '' },
  });

  const accept = async (person: InviteForm) => {
    setRefusal(null);
    try {
      const me = await answer(api.POST('/api/auth/first-admin', { body: { token, ...person } }));
      await mutate(ME_KEY, me, { revalidate: false });
      void navigate('/', { replace: true });
    } catch (error) {
      const fieldOf = (path: string) => (FIELDS.includes(path) ? (path as keyof InviteForm) : null);
      setRefusal(applyProblem(asProblem(error), setError, fieldOf));
    }
  };

  if (token === '') {
    return (
      <OpeningPage title="The link is not whole">
        <Typography sx={{ mt: 1 }}>
          It must end in <b>?token=</b> and a long word. Copy it whole from the server’s output, or start the
          server again: it prints a new one while there is no administrator.
        </Typography>
      </OpeningPage>
    );
  }
  return (
    <OpeningPage title="Set up your team">
      <Typography color="textSecondary">
        You become its first administrator and can add the others.
      </Typography>
      <Box component="form" noValidate onSubmit={(event) => void handleSubmit(accept)(event)} sx={formSx}>
        {refusal !== null && <Alert severity="error">{refusal}</Alert>}
        <TextInput
          control={control}
          name="name"
          label="Your name"
          autoComplete="name"
          autoFocus
          required
          most={120}
        />
        <TextInput
          control={control}
          name="email"
          label="E-mail address"
          type="email"
          autoComplete="username"
          required
        />
        <TextInput
          control={control}
          name="password"
          label="Password"
          type="password"
          autoComplete="new-password"
          hint="At least 10 characters; a sentence is easiest to keep in mind."
          required
          least={10}
          most={200}
        />
        <Button type="submit" variant="contained" disabled={formState.isSubmitting}>
          Create the account
        </Button>
      </Box>
    </OpeningPage>
  );
}

const formSx = { display: 'flex', flexDirection: 'column', gap: 1.75, mt: 2 } as const;

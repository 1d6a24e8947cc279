import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { useEffect, useState } from 'react';
import { useForm } from 'react-hook-form';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { useSWRConfig } from 'swr';
import { answer, api } from '../../api/client';
import { ME_KEY, useMe } from '../../api/hooks/useMe';
import { useWelcome } from '../../api/hooks/useWelcome';
import { asProblem } from '../../api/problem';
import { applyProblem } from '../../components/applyProblem';
import { TextInput } from '../../components/TextInput';
import { DemoAccounts } from './DemoAccounts';
import { OpeningPage } from './OpeningPage';

interface SignInForm {
  email: string;
  password: string;
}

/** Only a path of this app, so that a crafted link cannot send people elsewhere after signing in. */
function safeTarget(to: string | null): string {
  return to !== null && /^\/(?![/\\])/.test(to) ? to : '/';
}

export default function SignInPage() {
  const navigate = useNavigate();
  const [params] = useSearchParams();
  const { mutate } = useSWRConfig();
  const { me } = useMe();
  const { welcome } = useWelcome();
  const [refusal, setRefusal] = useState<string | null>(null);
  const { control, handleSubmit, setError, formState } = useForm<SignInForm>({
    defaultValues: { email: '', password: '' },
  });
  const target = safeTarget(params.get('to'));

  useEffect(() => {
    if (me) void navigate(target, { replace: true });
  }, [me, navigate, target]);

  const signIn = async (credentials: SignInForm) => {
    setRefusal(null);
    try {
      const person = await answer(api.POST('/api/auth/sign-in', { body: credentials }));
      // The next page starts with who is signed in already known; the rest is asked for anew.
      await mutate(ME_KEY, person, { revalidate: false });
    } catch (error) {
      const fieldOf = (path: string) => (path === 'email' || path === 'password' ? path : null);
      setRefusal(applyProblem(asProblem(error), setError, fieldOf));
    }
  };

  return (
    <OpeningPage title="Sign in">
      <Box component="form" noValidate onSubmit={(event) => void handleSubmit(signIn)(event)} sx={formSx}>
        {refusal !== null && <Alert severity="error">{refusal}</Alert>}
        <TextInput
          control={control}
          name="email"
          label="E-mail address"
          type="email"
          autoComplete="username"
          autoFocus
          required
        />
        <TextInput
          control={control}
          name="password"
          label="Password"
          type="password"
          autoComplete="current-password"
          required
          most={200}
        />
        <Button type="submit" variant="contained" disabled={formState.isSubmitting}>
          {formState.isSubmitting ? 'Signing in…' : 'Sign in'}
        </Button>
      </Box>
      {welcome?.demo === true && welcome.password !== null && (
        <DemoAccounts
          accounts={welcome.accounts}
          disabled={formState.isSubmitting}
          onChoose={(email) => void signIn({ email, password: welcome.password ?? '' })}
        />
      )}
      {welcome?.demo === false && (
        <Typography variant="body2" color="textSecondary" sx={{ mt: 3 }}>
          No account, or the password is lost? An administrator of your team can help.
        </Typography>
      )}
    </OpeningPage>
  );
}

const formSx = { display: 'flex', flexDirection: 'column', gap: 1.75, mt: 2 } as const;

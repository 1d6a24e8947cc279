import { AppShell } from './AppShell';
import { RequireSignIn } from './RequireSignIn';

export function SignedInShell() {
  return (
    <RequireSignIn>
      <AppShell />
    </RequireSignIn>
  );
}

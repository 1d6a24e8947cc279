import { useState, type ReactNode } from 'react';
import { Navigate, useLocation } from 'react-router-dom';
import { useMe } from '../api/hooks/useMe';
import { ErrorState } from '../components/ErrorState';
import { PageLoading } from './PageLoading';
import { SignInAgain } from './SignInAgain';

/**
 * Lets only signed-in people through. When a session ends in the middle of work the page stays as it is, with
 * everything typed, and a dialog asks to sign in again.
 */
export function RequireSignIn({ children }: { children: ReactNode }) {
  const { me, problem, isLoading, mutate } = useMe();
  const location = useLocation();
  const [wasHere, setWasHere] = useState<string | null>(null);
  if (me && me.email !== wasHere) setWasHere(me.email);
  if (me === undefined && problem !== null)
    return <ErrorState problem={problem} onRetry={() => void mutate()} />;
  if (me === undefined && isLoading) return <PageLoading />;
  if (!me && wasHere === null) {
    const back = location.pathname + location.search;
    return <Navigate to={back === '/' ? '/sign-in' : `/sign-in?to=${encodeURIComponent(back)}`} replace />;
  }
  return (
    <>
      {children}
      {!me && wasHere !== null && <SignInAgain email={wasHere} />}
    </>
  );
}

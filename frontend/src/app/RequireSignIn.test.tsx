import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useSWRConfig } from 'swr';
import { describe, expect, it } from 'vitest';
import { ME_KEY, useMe } from '../api/hooks/useMe';
import { renderAt } from '../testing/renderAt';
import { me, pretendServer, refusal } from '../testing/server';
import { RequireSignIn } from './RequireSignIn';

const SIGNED_OUT = refusal(401, 'signed-out', 'Sign in first.');

/** A page for some roles only, with a text field, and a button that does what any refused request does: ask again who is signed in. */
function Page() {
  const { mutate } = useSWRConfig();
  const { can } = useMe();
  if (!can('parts.edit')) return <p>Not for you</p>;
  return (
    <>
      <input aria-label="Title" />
      <button onClick={() => void mutate(ME_KEY)}>Ask again</button>
    </>
  );
}

describe('RequireSignIn', () => {
  it('sends a stranger to sign in and remembers where they wanted to go', async () => {
    pretendServer({ 'GET /api/auth/me': SIGNED_OUT });
    renderAt(
      '/parts?kind=gear',
      '/parts',
      <RequireSignIn>
        <Page />
      </RequireSignIn>,
    );
    await waitFor(() =>
      expect(screen.getByTestId('address')).toHaveTextContent(
        `/sign-in?to=${encodeURIComponent('/parts?kind=gear')}`,
      ),
    );
  });

  it('keeps the page and its text when the session ends in the middle, and lets the person back in', async () => {
    let signedIn = true;
    pretendServer({
      'GET /api/auth/me': () => (signedIn ? me(['parts.edit']) : SIGNED_OUT),
      'POST /api/auth/sign-in': () => {
        signedIn = true;
        return me(['parts.edit']);
      },
    });
    const user = userEvent.setup();
    renderAt(
      '/parts',
      '/parts',
      <RequireSignIn>
        <Page />
      </RequireSignIn>,
    );
    await user.type(await screen.findByLabelText('Title'), 'half a sentence');
    signedIn = false;
    await user.click(screen.getByRole('button', { name: 'Ask again' }));
    expect(await screen.findByRole('dialog', { name: 'Your session ended' })).toBeVisible();
    expect(screen.getByTestId('address')).toHaveTextContent('/parts');
    await user.type(screen.getByLabelText('Password'), 'stageyard-demo');
    await user.click(screen.getByRole('button', { name: 'Sign in' }));
    await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull());
    expect(screen.getByLabelText('Title')).toHaveValue('half a sentence');
  });

  it('tells a server that does not answer apart from being signed out', async () => {
    pretendServer({ 'GET /api/auth/me': refusal(500, 'internal', 'The server failed.') });
    renderAt(
      '/parts',
      '/parts',
      <RequireSignIn>
        <Page />
      </RequireSignIn>,
    );
    expect(await screen.findByRole('button', { name: 'Try again' })).toBeVisible();
    expect(screen.getByTestId('address')).toHaveTextContent('/parts');
  });
});

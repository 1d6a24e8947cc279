import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { newPart } from '../../testing/parts';
import { renderAt } from '../../testing/renderAt';
import { me, pretendServer, refusal } from '../../testing/server';
import PartPage from './PartPage';

const GET_PART = 'GET /api/parts/KW-00017';
const PATCH_PART = 'PATCH /api/parts/KW-00017';
const BASE = {
  'GET /api/auth/me': me(['parts.read', 'parts.edit']),
  'GET /api/parts/KW-00017/changes': { body: { items: [], total: 0, page: 1, size: 25 } },
  [GET_PART]: { body: newPart() },
};

const open = (address = '/parts/KW-00017?edit=1') => renderAt(address, '/parts/:number', <PartPage />);

describe('the edit form of a part', () => {
  it('puts a refusal at its field and keeps what was typed', async () => {
    const { sent } = pretendServer({
      ...BASE,
      [PATCH_PART]: refusal(400, 'bad-input', 'The part was not saved.', {
        errors: [
          {
            field: 'attributes.bore',
            value: 70,
            limit: 51,
            message: 'The bore must stay below the root circle.',
          },
        ],
      }),
    });
    const user = userEvent.setup();
    open();
    const bore = await screen.findByLabelText(/^Bore/);
    await user.clear(bore);
    await user.type(bore, '70,0');
    await user.click(screen.getByRole('button', { name: 'Save changes' }));
    expect(await screen.findByText('The bore must stay below the root circle.')).toBeVisible();
    expect(bore).toHaveValue('70,0');
    expect(bore).toBeInvalid();
    const patch = sent.find(({ method }) => method === 'PATCH')?.body;
    expect(patch).toMatchObject({ version: 3, attributes: { bore: 70, teeth: 28, hand: null } });
  });

  it('shows what changed meanwhile, keeps what was typed, and saves over it when told to', async () => {
    const theirs = newPart({ version: 4, mass: 0.21, updatedBy: 'Ada Holm' });
    let stale = true;
    const { sent } = pretendServer({
      ...BASE,
      [PATCH_PART]: () => {
        if (!stale) return { body: newPart({ version: 5, description: 'Mine' }) };
        stale = false;
        return refusal(409, 'changed-meanwhile', 'Somebody changed it meanwhile.', { current: theirs });
      },
    });
    const user = userEvent.setup();
    open();
    const description = await screen.findByLabelText(/^Description/);
    await user.clear(description);
    await user.type(description, 'Mine');
    await user.click(screen.getByRole('button', { name: 'Save changes' }));
    expect(await screen.findByText(/Ada Holm changed this part/)).toBeVisible();
    expect(screen.getByText('0.21')).toBeVisible();
    expect(description).toHaveValue('Mine');
    await user.click(screen.getByRole('button', { name: 'Save mine over it' }));
    await waitFor(() => expect(screen.getByTestId('address')).toHaveTextContent(/^\/parts\/KW-00017$/));
    const versions = sent
      .filter(({ method }) => method === 'PATCH')
      .map(({ body }) => (body as { version: number }).version);
    expect(versions).toEqual([3, 4]);
  });

  it('keeps everything when the server does not answer', async () => {
    pretendServer({
      ...BASE,
      [PATCH_PART]: () => {
        throw new TypeError('Failed to fetch');
      },
    });
    const user = userEvent.setup();
    open();
    const note = await screen.findByLabelText('Note');
    await user.type(note, 'Checked on the bench');
    await user.click(screen.getByRole('button', { name: 'Save changes' }));
    expect(await screen.findByText(/did not answer/)).toBeVisible();
    expect(note).toHaveValue('Checked on the bench');
  });

  it('computes the geometry as one types, and says when a gear cannot be cut', async () => {
    pretendServer(BASE);
    const user = userEvent.setup();
    open();
    // d = m z = 56 mm, d_a = m (z + 2) = 60 mm.
    expect(await screen.findByText('60.000')).toBeVisible();
    const teeth = screen.getByLabelText(/^Teeth/);
    await user.clear(teeth);
    await user.type(teeth, '9');
    // 9 teeth without shift are undercut: fewer than 17 at 20°.
    expect(await screen.findByText(/the root is undercut/)).toBeVisible();
    const shift = screen.getByLabelText(/^Profile shift/);
    await user.clear(shift);
    await user.type(shift, '1.5');
    expect(await screen.findByText('This gear cannot be cut.')).toBeVisible();
  });

  it('asks before unsaved text is left behind', async () => {
    pretendServer(BASE);
    const user = userEvent.setup();
    const { router } = open();
    await user.type(await screen.findByLabelText('Note'), 'x');
    void router.navigate('/parts');
    expect(await screen.findByRole('dialog', { name: 'Leave without saving?' })).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Stay here' }));
    expect(screen.getByLabelText('Note')).toHaveValue('x');
  });
});

describe('the part page', () => {
  it('offers no edit to someone who may only look, even by address', async () => {
    pretendServer({ ...BASE, 'GET /api/auth/me': me(['parts.read']) });
    open('/parts/KW-00017?edit=1');
    expect(await screen.findByRole('heading', { name: /KW-00017/ })).toBeVisible();
    expect(screen.queryByRole('button', { name: 'Edit' })).toBeNull();
    expect(screen.queryByRole('button', { name: 'Withdraw' })).toBeNull();
    expect(screen.queryByLabelText(/^Description/)).toBeNull();
  });

  it('withdraws with a successor after asking once', async () => {
    let stored = newPart();
    const { sent } = pretendServer({
      ...BASE,
      'GET /api/finder': { body: { parts: [], briefs: [], trains: [] } },
      [GET_PART]: () => ({ body: stored }),
      [PATCH_PART]: () => {
        stored = newPart({ standing: 'withdrawn', successorNumber: 'KW-00018', version: 4 });
        return { body: stored };
      },
    });
    const user = userEvent.setup();
    open('/parts/KW-00017');
    await user.click(await screen.findByRole('button', { name: 'Withdraw' }));
    await user.type(screen.getByLabelText('Use this part instead'), 'KW-00018');
    await user.click(screen.getByRole('button', { name: 'Withdraw KW-00017' }));
    expect(await screen.findByRole('link', { name: 'KW-00018' })).toBeInTheDocument();
    expect(sent.find(({ method }) => method === 'PATCH')?.body).toEqual({
      version: 3,
      standing: 'withdrawn',
      successorNumber: 'KW-00018',
    });
  });

  it('says what is missing for an unknown number', async () => {
    pretendServer({ ...BASE, [GET_PART]: refusal(404, 'not-found', 'There is no part KW-00017.') });
    open('/parts/KW-00017');
    expect(await screen.findByText('There is no part KW-00017.')).toBeVisible();
  });
});

import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { beforeEach, describe, expect, it } from 'vitest';
import { renderAt } from '../../../testing/renderAt';
import { pretendServer, refusal, type SentRequest } from '../../../testing/server';
import { newMovement, newStockItem } from '../../../testing/stock';
import { CountRoundView } from './CountRoundView';

/** A person of their own for each test: what is kept on the device is kept by person. */
let person = 0;
beforeEach(() => {
  person += 1;
  localStorage.clear();
});

const ITEM = 'GET /api/stock/items/KW-00017';
const BOOK = 'POST /api/stock/movements';
const BASE = {
  'GET /api/stock/places': { body: [{ place: 'Rack A', parts: 1 }] },
  'GET /api/stock': { body: { items: [newStockItem()], total: 1, page: 1, size: 100 } },
  [ITEM]: { body: newStockItem() },
};

const away = (): never => {
  throw new TypeError('Failed to fetch');
};

async function openAt(place: string) {
  const user = userEvent.setup({ delay: null });
  renderAt('/stock/count', '/stock/count', <CountRoundView userId={`person-${person}`} />);
  await user.type(await screen.findByLabelText('Place'), `${place}{Enter}`);
  return user;
}

/** Types as a scanner does, which ends with Enter, and then the figure. */
async function count(user: ReturnType<typeof userEvent.setup>, number: string, figure: string) {
  await user.type(await screen.findByLabelText('Part number'), `${number}{Enter}`);
  const field = await screen.findByLabelText('What is there');
  expect(field).toHaveFocus();
  await user.type(field, `${figure}{Enter}`);
}

const counted = (sent: SentRequest[]) =>
  sent.filter(({ method }) => method === 'POST').map(({ body }) => body as Record<string, unknown>);

describe('counting', () => {
  it('takes number, figure, next; shows the books only afterwards; says what it saw', async () => {
    const { sent } = pretendServer({ ...BASE, [BOOK]: { status: 201, body: newMovement() } });
    const user = await openAt('rack a');
    // The place as the books write it.
    expect(await screen.findByRole('heading', { level: 1 })).toHaveTextContent('Count Rack A');
    await user.type(await screen.findByLabelText('Part number'), 'KW-00017{Enter}');
    expect(await screen.findByText('Spur gear, steel, 28 teeth')).toBeVisible();
    expect(screen.queryByText(/40/)).not.toBeInTheDocument();
    await user.type(screen.getByLabelText('What is there'), '39{Enter}');
    expect(await screen.findByText(/−1 pcs to the books · booked/)).toBeVisible();
    expect(screen.getByLabelText('Part number')).toHaveFocus();
    expect(counted(sent)).toMatchObject([
      { number: 'KW-00017', kind: 'counted', quantity: 39, place: 'Rack A', seenMovementId: 7 },
    ]);
  });

  it('asks about a figure far from the books before it takes it', async () => {
    const { sent } = pretendServer({ ...BASE, [BOOK]: { status: 201, body: newMovement() } });
    const user = await openAt('Rack A');
    await count(user, 'KW-00017', '12');
    expect(await screen.findByText(/the books say 40 pcs/)).toBeVisible();
    expect(counted(sent)).toEqual([]);
    await user.click(screen.getByRole('button', { name: 'Count again' }));
    await user.type(screen.getByLabelText('What is there'), '38{Enter}');
    await waitFor(() => expect(counted(sent)).toMatchObject([{ quantity: 38 }]));
  });

  it('refuses what is no count, and a number that no part has, and keeps both', async () => {
    const { sent } = pretendServer(BASE);
    const user = await openAt('Rack A');
    await user.type(await screen.findByLabelText('Part number'), 'NO-SUCH{Enter}');
    expect(await screen.findByText(/Nothing at/)).toBeVisible();
    expect(screen.getByLabelText('Part number')).toHaveValue('NO-SUCH');
    await user.clear(screen.getByLabelText('Part number'));
    for (const [figure, words] of [
      ['-1', /at least 0/],
      ['1000000000000', /at most 1,000,000/],
      ['1.5', /whole number/],
      ['KW-00017', /not a number/],
    ] as const) {
      if (screen.queryByLabelText('Part number')) {
        await user.type(screen.getByLabelText('Part number'), 'KW-00017{Enter}');
      }
      const field = await screen.findByLabelText('What is there');
      await user.clear(field);
      await user.type(field, `${figure}{Enter}`);
      expect(await screen.findByText(words)).toBeVisible();
      expect(field).toHaveValue(figure);
    }
    expect(counted(sent)).toEqual([]);
  });

  it('keeps counts while the network is away, and sends them in order with the same keys', async () => {
    let isAway = true;
    const answers = { status: 201, body: newMovement() };
    const { sent } = pretendServer({
      ...BASE,
      [ITEM]: () => (isAway ? away() : { body: newStockItem() }),
      [BOOK]: () => (isAway ? away() : answers),
    });
    const user = await openAt('Rack A');
    // The list of the place came before the network went away: number and words are known.
    await waitFor(() => expect(localStorage.getItem('stageyard.shelf')).toContain('KW-00017'));
    await count(user, 'KW-00017', '39');
    await count(user, 'KW-00017', '38');
    expect(await screen.findByText(/2 counts wait for the network/)).toBeVisible();
    const tried = counted(sent).map(({ requestKey }) => requestKey);
    isAway = false;
    await user.click(screen.getByRole('button', { name: 'Send now' }));
    await waitFor(() => expect(screen.getAllByText(/· booked/)).toHaveLength(2));
    const requests = counted(sent).slice(tried.length);
    expect(requests.map(({ quantity }) => quantity)).toEqual([39, 38]);
    expect(requests[0]?.requestKey).toBe(tried[0]);
    // The second has seen the first, which the server numbered 8.
    expect(requests.map(({ seenMovementId }) => seenMovementId)).toEqual([7, 8]);
  });

  it('has seen its own last count where the network went away right after it', async () => {
    let isAway = false;
    const { sent } = pretendServer({
      ...BASE,
      [ITEM]: () => (isAway ? away() : { body: newStockItem() }),
      [BOOK]: { status: 201, body: newMovement({ id: 8, after: 39 }) },
    });
    const user = await openAt('Rack A');
    await waitFor(() => expect(localStorage.getItem('stageyard.shelf')).toContain('KW-00017'));
    await count(user, 'KW-00017', '39');
    await waitFor(() => expect(counted(sent)).toHaveLength(1));
    await screen.findByText(/· booked/);
    isAway = true;
    await count(user, 'KW-00017', '38');
    await waitFor(() => expect(counted(sent)).toHaveLength(2));
    expect(counted(sent).map(({ seenMovementId }) => seenMovementId)).toEqual([7, 8]);
  });

  it('writes each count to the device at once, so that a closed page loses none', async () => {
    pretendServer({ ...BASE, [BOOK]: away });
    const user = await openAt('Rack A');
    await count(user, 'KW-00017', '39');
    await waitFor(() =>
      expect(localStorage.getItem(`stageyard.count.person-${person}`)).toContain('"counted":39'),
    );
  });

  it('keeps a refused count with the reason, and sends the figure again once somebody looked', async () => {
    const places = [{ place: 'Rack A', quantity: 36, lastMovementId: 9, countedAt: null }];
    let stale = true;
    const { sent } = pretendServer({
      ...BASE,
      [BOOK]: () => {
        if (!stale) return { status: 201, body: newMovement({ id: 10, change: 3 }) };
        stale = false;
        const more = { current: newStockItem({ places }) };
        return refusal(409, 'changed-meanwhile', 'Since you looked, Petra Voss issued 4 pcs.', more);
      },
    });
    const user = await openAt('Rack A');
    await count(user, 'KW-00017', '39');
    const list = await screen.findByRole('list', { name: 'Counted in this round' });
    expect(await within(list).findByText('Since you looked, Petra Voss issued 4 pcs.')).toBeVisible();
    await user.click(within(list).getByRole('button', { name: '39 pcs is right: send it' }));
    expect(await within(list).findByText(/\+3 pcs to the books · booked/)).toBeVisible();
    const [first, second] = counted(sent);
    expect(second).toMatchObject({ quantity: 39, seenMovementId: 9 });
    expect(second?.requestKey).not.toBe(first?.requestKey);
  });

  it('does not count away what was booked after a count that knew nothing of the shelf', async () => {
    let isAway = true;
    const later = newMovement({ id: 12, after: 6, at: '2999-01-01T00:00:00.000Z' });
    const { sent } = pretendServer({
      ...BASE,
      'GET /api/stock': away,
      [ITEM]: away,
      [BOOK]: { status: 201, body: newMovement() },
      'GET /api/stock/movements': () =>
        isAway ? away() : { body: { items: [later], total: 1, page: 1, size: 1 } },
    });
    const user = await openAt('Rack A');
    await count(user, 'KW-00017', '39');
    expect(await screen.findByText(/One count waits/)).toBeVisible();
    isAway = false;
    await user.click(screen.getByRole('button', { name: 'Send now' }));
    expect(await screen.findByText(/now the books say 6 pcs/)).toBeVisible();
    expect(counted(sent)).toEqual([]);
  });
});

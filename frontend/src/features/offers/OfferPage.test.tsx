import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { newOffer, newSupplier } from '../../testing/offers';
import { renderAt } from '../../testing/renderAt';
import { me, pretendServer, refusal } from '../../testing/server';
import OfferPage from './OfferPage';

const GET_OFFER = 'GET /api/offers/7';
const PATCH_OFFER = 'PATCH /api/offers/7';
const BASE = {
  'GET /api/auth/me': me(['prices.read', 'prices.edit']),
  'GET /api/offers/7/changes': { body: { items: [], total: 0, page: 1, size: 25 } },
  'GET /api/suppliers/S-0001': { body: newSupplier() },
  [GET_OFFER]: { body: newOffer() },
};

const edit = () => renderAt('/offers/7?edit=1', '/offers/:id', <OfferPage />);
const quantity = (row: number) => screen.findByLabelText(`From quantity, row ${row}`);
const price = (row: number) => screen.getByLabelText(`Price, row ${row}`);

describe('the offer form', () => {
  it('refuses falling quantities, a negative price and too many decimals before anything is sent', async () => {
    const { sent } = pretendServer(BASE);
    const user = userEvent.setup({ delay: null });
    edit();
    await user.clear(await quantity(2));
    await user.type(await quantity(2), '0.5');
    await user.clear(price(1));
    await user.type(price(1), '-3');
    await user.clear(price(2));
    await user.type(price(2), '11.105');
    await user.click(screen.getByText('Save changes'));
    expect(await screen.findByText('Must be above 1, the quantity before it.')).toBeVisible();
    expect(screen.getByText('An amount must be above 0.')).toBeVisible();
    expect(screen.getByText(/EUR has 2 decimals/)).toBeVisible();
    expect(price(2)).toHaveValue('11.105');
    expect(sent.some(({ method }) => method === 'PATCH')).toBe(false);
  });

  it('says what a quantity comes to as the prices are typed', async () => {
    pretendServer(BASE);
    const user = userEvent.setup({ delay: null });
    edit();
    const tried = await screen.findByLabelText('Try a quantity, pcs');
    await user.clear(tried);
    await user.type(tried, '30');
    // 30 × 11.10 EUR = 333.00 EUR.
    expect(await screen.findByText('333.00 EUR')).toBeVisible();
    const pack = screen.getByLabelText(/^Sold in packs of/);
    await user.clear(pack);
    await user.type(pack, '25');
    // Two packs of 25: 50 × 11.10 EUR = 555.00 EUR, 20 left over.
    expect(await screen.findByText('555.00 EUR')).toBeVisible();
    expect(screen.getByText(/20 pcs are left over/)).toBeVisible();
    await user.clear(price(2));
    expect(await screen.findByText(/Give a quantity and a price/)).toBeVisible();
  });

  it('puts the server’s refusal of one price at that price', async () => {
    pretendServer({
      ...BASE,
      [PATCH_OFFER]: refusal(400, 'bad-input', 'The offer was not saved.', {
        errors: [{ field: 'breaks.1.unitPrice', value: 1110, message: 'That is too much.' }],
      }),
    });
    const user = userEvent.setup({ delay: null });
    edit();
    await quantity(1);
    await user.click(screen.getByText('Save changes'));
    expect(await screen.findByText('That is too much.')).toBeVisible();
    expect(price(2)).toBeInvalid();
  });

  it('refuses an offer that ends before it starts', async () => {
    const { sent } = pretendServer(BASE);
    const user = userEvent.setup({ delay: null });
    edit();
    await user.type(await screen.findByLabelText('Valid until'), '2026-10-31');
    await user.click(screen.getByText('Save changes'));
    expect(await screen.findByText(/It ends before it starts/)).toBeVisible();
    expect(sent.some(({ method }) => method === 'PATCH')).toBe(false);
  });
});

describe('the offer page', () => {
  it('shows what somebody else changed meanwhile, keeps what was typed, and saves over it when told to', async () => {
    const theirs = newOffer({ version: 4, leadTimeDays: 20, updatedBy: 'Levi Marsh' });
    let stale = true;
    const { sent } = pretendServer({
      ...BASE,
      [PATCH_OFFER]: () => {
        if (!stale) return { body: newOffer({ version: 5 }) };
        stale = false;
        return refusal(409, 'changed-meanwhile', 'Somebody changed it meanwhile.', { current: theirs });
      },
    });
    const user = userEvent.setup({ delay: null });
    edit();
    await quantity(1);
    await user.clear(price(1));
    await user.type(price(1), '12.10');
    await user.click(screen.getByText('Save changes'));
    const notice = await screen.findByText(/Levi Marsh changed this offer/);
    expect(within(notice.closest('[role="alert"]') as HTMLElement).getByText('20 days')).toBeVisible();
    expect(price(1)).toHaveValue('12.10');
    await user.click(screen.getByRole('button', { name: 'Save mine over it' }));
    await waitFor(() => expect(screen.getByTestId('address')).toHaveTextContent(/^\/offers\/7$/));
    const versions = sent
      .filter(({ method }) => method === 'PATCH')
      .map(({ body }) => (body as { version: number }).version);
    expect(versions).toEqual([3, 4]);
    // 12.10 EUR are 1,210 cents.
    expect(sent.findLast(({ method }) => method === 'PATCH')?.body).toMatchObject({
      breaks: [
        { quantity: 1, unitPrice: 1210 },
        { quantity: 10, unitPrice: 1110 },
      ],
    });
  });

  it('offers no edit to someone who may only see prices, even by address', async () => {
    pretendServer({ ...BASE, 'GET /api/auth/me': me(['prices.read']) });
    edit();
    expect(await screen.findByRole('heading', { name: /KW-00017/ })).toBeVisible();
    expect(screen.queryByRole('button', { name: 'Edit' })).toBeNull();
    expect(screen.queryByLabelText('From quantity, row 1')).toBeNull();
  });

  it('says what is missing for an offer that is not there, and whose prices are not for everyone', async () => {
    pretendServer({ ...BASE, [GET_OFFER]: refusal(404, 'not-found', 'There is no offer 7.') });
    renderAt('/offers/7', '/offers/:id', <OfferPage />);
    expect(await screen.findByText('There is no offer 7.')).toBeVisible();
  });
});

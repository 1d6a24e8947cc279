import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import type { PartOffers as Offers } from '../../api/types';
import { newOffer } from '../../testing/offers';
import { newPart } from '../../testing/parts';
import { renderAt } from '../../testing/renderAt';
import { me, pretendServer } from '../../testing/server';
import { PartOffers } from './PartOffers';

const GET_OFFERS = 'GET /api/parts/KW-00017/offers';
const eur = (minor: number) => ({ minor, currency: 'EUR' });

/** 90 pieces at 11.10 in packs of 25: 100 pieces are ordered, 10 are left over. */
const OFFERS: Offers = {
  quantity: 90,
  unit: 'pcs',
  onShelf: null,
  reason: null,
  offers: [
    {
      ...newOffer(),
      price: {
        needed: 90,
        orderQuantity: 100,
        surplus: 10,
        unitPrice: 1110,
        per: 1,
        breakQuantity: 10,
        lineTotal: eur(111_000),
        cheaperAt: { orderQuantity: 200, lineTotal: eur(100_000), saves: eur(11_000) },
      },
      arrivalDays: 12,
      chosen: true,
    },
    {
      ...newOffer({ id: '8', state: 'expired', validUntil: '2026-10-31' }),
      supplier: { code: 'S-0002', name: 'Old Quay Supply', standing: 'active' },
      price: null,
      arrivalDays: null,
      chosen: false,
    },
  ],
};

const show = () => renderAt('/parts/KW-00017', '/parts/:number', <PartOffers part={newPart()} />);

describe('the offers of a part', () => {
  it('asks for the typed quantity and says what is taken, why, what is left over and what would cost less', async () => {
    const { sent } = pretendServer({
      'GET /api/auth/me': me(['prices.read']),
      [GET_OFFERS]: { body: OFFERS },
    });
    const user = userEvent.setup();
    show();
    const quantity = await screen.findByLabelText('At quantity, pcs');
    await user.clear(quantity);
    await user.type(quantity, '90');
    await waitFor(() => expect(sent.at(-1)?.path).toContain('quantity=90'));
    expect(screen.getByText(/It is the only offer that holds today/)).toBeVisible();
    expect(screen.getByText(/Ordering 200 pcs costs less: 1,000\.00 EUR, 110\.00 EUR saved/)).toBeVisible();
    const taken = screen.getByRole('row', { name: /taken by the rule/ });
    expect(within(taken).getByText('10 left over')).toBeVisible();
    expect(within(taken).getByText('1,110.00')).toBeVisible();
    expect(screen.getByRole('row', { name: /Old Quay Supply/ })).toHaveTextContent('ended 31 Oct 2026');
  });

  it('keeps the last answer while the figure cannot be read, and asks nothing', async () => {
    const { sent } = pretendServer({
      'GET /api/auth/me': me(['prices.read']),
      [GET_OFFERS]: { body: OFFERS },
    });
    const user = userEvent.setup();
    show();
    const quantity = await screen.findByLabelText('At quantity, pcs');
    await user.clear(quantity);
    await user.type(quantity, '2.5');
    expect(await screen.findByText(/whole number; 2\.5 is not one/)).toBeVisible();
    expect(screen.getByRole('row', { name: /taken by the rule/ })).toBeVisible();
    expect(sent.some(({ path }) => path.includes('quantity=2.5'))).toBe(false);
  });

  it('says what to do where nobody offers it', async () => {
    const none: Offers = { ...OFFERS, offers: [], reason: 'no-offers' };
    pretendServer({ 'GET /api/auth/me': me(['prices.read', 'prices.edit']), [GET_OFFERS]: { body: none } });
    show();
    expect(await screen.findByText('No supplier offers this part yet')).toBeVisible();
    expect(screen.getByRole('link', { name: 'Add an offer' })).toHaveAttribute(
      'href',
      '/add-offer?part=KW-00017',
    );
  });

  it('shows nothing and asks nothing without the right to see prices', async () => {
    const { sent } = pretendServer({ 'GET /api/auth/me': me(['parts.read']) });
    show();
    await waitFor(() => expect(sent.length).toBeGreaterThan(0));
    expect(screen.queryByText('Offers')).toBeNull();
    expect(sent.map(({ path }) => path)).toEqual(['/api/auth/me']);
  });
});

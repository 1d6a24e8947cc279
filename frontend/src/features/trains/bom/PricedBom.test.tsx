import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { expect, it } from 'vitest';
import type { Bom, Train, TrainPrices } from '../../../api/types';
import { newBom, newBomLine, newLinePrice, newPriceLine, newTrainPrices } from '../../../testing/boms';
import { renderAt } from '../../../testing/renderAt';
import { me, pretendServer, refusal } from '../../../testing/server';
import { newTrain } from '../../../testing/trains';
import { useTrain } from '../../../api/hooks/useTrain';
import { BomTab } from './BomTab';

const BUYS = ['trains.read', 'parts.read', 'prices.read', 'offers.choose'];
const line = newBomLine();
const seal = newBomLine({ key: 'SE-1', findNumber: 501, partNumber: 'SE-1', description: 'Seal 8 × 16 × 5' });
const bom = newBom([line, seal]);
const prices = newTrainPrices(
  [
    newPriceLine(),
    newPriceLine({ key: 'SE-1', findNumber: 501, partNumber: 'SE-1', price: null, reason: 'no-offers' }),
  ],
  { unpriced: [{ findNumber: 501, key: 'SE-1', reason: 'no-offers' }] },
);

function Page() {
  const { data } = useTrain('T-0007');
  return data ? <BomTab train={data} canExport /> : null;
}

interface Given {
  permissions?: string[];
  train?: Train;
  bom?: Bom;
  prices?: TrainPrices;
  more?: Parameters<typeof pretendServer>[0];
}

function show({
  permissions = BUYS,
  train = newTrain({ buildQuantity: 25 }),
  more = {},
  ...given
}: Given = {}) {
  const { sent } = pretendServer({
    'GET /api/auth/me': me(permissions),
    'GET /api/trains/T-0007': { body: train },
    'GET /api/trains/T-0007/bom': { body: given.bom ?? bom },
    'GET /api/trains/T-0007/prices': { body: given.prices ?? prices },
    ...more,
  });
  renderAt('/trains/T-0007?tab=bom', '/trains/:code', <Page />);
  return { sent, user: userEvent.setup() };
}

it('says the total and that it leaves a line out, and names the line with the next step', async () => {
  show({ permissions: [...BUYS, 'prices.edit'] });
  expect((await screen.findAllByText('without 1 line of unknown price')).length).toBe(2);
  expect(screen.getAllByText('178.50 EUR').length).toBeGreaterThan(1);
  const open = screen.getByRole('region', { name: '1 line without a price' });
  expect(open).toHaveTextContent('Find 501: SE-1 is offered by nobody here.');
  expect(within(open).getByRole('link', { name: 'Add an offer' })).toHaveAttribute(
    'href',
    '/add-offer?part=SE-1',
  );
});

it('never adds currencies together', async () => {
  const totals = [
    { currency: 'EUR', minor: 17850, lines: 1 },
    { currency: 'JPY', minor: 12000, lines: 1 },
  ];
  show({ prices: newTrainPrices(prices.lines, { totals }) });
  expect((await screen.findAllByText('178.50 EUR')).length).toBeGreaterThan(1);
  // Once above and once below the table.
  expect(screen.getAllByText('12,000 JPY')).toHaveLength(2);
});

it('shows the page without prices, and asks for none, to people who may not see them', async () => {
  const { sent } = show({ permissions: ['trains.read', 'parts.read'] });
  expect(await screen.findByRole('table', { name: 'Bill of materials' })).toBeVisible();
  expect(screen.queryByText(/EUR/)).toBeNull();
  expect(screen.queryByLabelText('Build quantity')).toBeNull();
  expect(sent.some(({ path }) => path.includes('/prices'))).toBe(false);
});

it('sets the build quantity, and keeps a wrong one in the field with what is wrong', async () => {
  const { sent, user } = show({
    more: { 'PUT /api/trains/T-0007/buying': { body: newTrain({ buildQuantity: 40, version: 5 }) } },
  });
  const field = await screen.findByLabelText('Build quantity');
  await user.clear(field);
  await user.type(field, '2.5{Enter}');
  expect(await screen.findByText('Give a whole number; 2.5 is not one.')).toBeVisible();
  expect(field).toHaveValue('2.5');
  expect(sent.some(({ method }) => method === 'PUT')).toBe(false);
  await user.clear(field);
  await user.type(field, '40');
  await user.click(screen.getByRole('button', { name: 'Set' }));
  expect(await screen.findByText('T-0007: 40 to build.')).toBeVisible();
  expect(sent.find(({ method }) => method === 'PUT')?.body).toEqual({ version: 4, buildQuantity: 40 });
});

it('keeps the typed quantity when somebody else changed the train', async () => {
  const theirs = newTrain({ buildQuantity: 10, version: 9 });
  const { user } = show({
    more: {
      'PUT /api/trains/T-0007/buying': refusal(409, 'changed-meanwhile', 'Changed.', { current: theirs }),
    },
  });
  const field = await screen.findByLabelText('Build quantity');
  await user.clear(field);
  await user.type(field, '40{Enter}');
  expect(await screen.findByText(/Somebody else saved this train/)).toBeVisible();
  expect(field).toHaveValue('40');
  expect(screen.getByRole('button', { name: 'Set' })).toBeEnabled();
});

it('copies the chosen lines with plain amounts', async () => {
  const { user } = show();
  await screen.findAllByText('178.50 EUR');
  await user.click(screen.getByText(line.description));
  await user.click(within(screen.getByRole('toolbar')).getByRole('button', { name: 'Copy' }));
  const [heads = '', ...rows] = (await navigator.clipboard.readText()).split('\n');
  expect(rows).toHaveLength(1);
  const cell = (head: string) => rows[0]?.split('\t')[heads.split('\t').indexOf(head)];
  expect(cell('Line total')).toBe('178.50');
  expect(cell('Currency')).toBe('EUR');
  expect(cell('Needed')).toBe('50');
});

it('tells of a chosen offer that cannot be used any more', async () => {
  const message = 'The offer chosen for BR-00401 ended on 30 Nov 2026; the rule took another.';
  const lost = [{ partNumber: 'BR-00401', offerId: '3', key: 'BR-00401', message }];
  const { sent, user } = show({
    prices: newTrainPrices([newPriceLine({ price: newLinePrice() })], { lostChoices: lost }),
    more: { 'PUT /api/trains/T-0007/buying': { body: newTrain({ version: 5 }) } },
  });
  expect(await screen.findByText(message)).toBeVisible();
  await user.click(screen.getByRole('button', { name: 'Let the rule choose' }));
  expect(sent.find(({ method }) => method === 'PUT')?.body).toEqual({
    version: 4,
    choices: [{ partNumber: 'BR-00401', offerId: null }],
  });
});

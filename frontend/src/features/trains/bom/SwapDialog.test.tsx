import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { expect, it, vi } from 'vitest';
import type { BomLine, Substitutes, SwapResult } from '../../../api/types';
import { newBomLine } from '../../../testing/boms';
import { newPart } from '../../../testing/parts';
import { renderAt } from '../../../testing/renderAt';
import { pretendServer, refusal, type Answer, type SentRequest } from '../../../testing/server';
import { newTrain } from '../../../testing/trains';
import { SwapDialog } from './SwapDialog';

const SWAPS = 'POST /api/trains/T-0007/swaps';
const substitutes: Substitutes = {
  quantity: 50,
  leftOut: 0,
  items: [
    {
      part: newPart({ number: 'BR-00402', description: 'Bearing with seals' }),
      differences: ['sealed on both sides'],
      toCheck: [],
      successor: false,
      onShelf: 60,
      offer: null,
      arrivalDays: 0,
    },
    {
      part: newPart({ number: 'BR-00403', description: 'Bearing, stainless' }),
      differences: [],
      toCheck: ['load rating 20 % lower'],
      successor: false,
      onShelf: null,
      offer: { supplier: 'Inlet', currency: 'EUR', lineTotal: 21000, orderQuantity: 50, leadTimeDays: 9 },
      arrivalDays: 9,
    },
  ],
};
const result: SwapResult = {
  train: null,
  changes: [{ what: 'Price of 50 pcs', before: '178.50 EUR', after: '210.00 EUR', verdict: 'worse' }],
  checks: [
    {
      label: 'Static load safety',
      stage: 0,
      unit: '',
      before: { value: 1.1, verdict: 'marginal' },
      after: { value: 1.6, verdict: 'passes' },
    },
  ],
};

function show(swaps: Answer | ((request: SentRequest) => Answer), line: BomLine = newBomLine()) {
  const { sent } = pretendServer({
    'GET /api/trains/T-0007/substitutes': { body: substitutes },
    [SWAPS]: swaps,
  });
  const onClose = vi.fn();
  renderAt('/', '/', <SwapDialog train={newTrain()} line={line} needed={50} canSwap onClose={onClose} />);
  return { sent, onClose, user: userEvent.setup() };
}

const booked = (sent: SentRequest[]) =>
  sent.filter(({ method, body }) => method === 'POST' && (body as { dryRun: boolean }).dryRun === false);

it('shows what a part changes before anything is booked, then books exactly that', async () => {
  const { sent, onClose, user } = show(({ body }) => {
    const { dryRun } = body as { dryRun: boolean };
    return { body: dryRun ? result : { ...result, train: newTrain({ version: 5 }) } };
  });
  await user.click(await screen.findByRole('radio', { name: /BR-00403.*in 9 days/ }));
  const changes = await screen.findByRole('table', { name: 'What changes' });
  expect(
    within(changes).getByRole('row', { name: /Price of 50 pcs.* 178.50 EUR 210.00 EUR worse/ }),
  ).toBeVisible();
  expect(
    within(changes).getByRole('row', {
      name: /Static load safety, stage 1.* 1.100 marginal 1.600 passes better/,
    }),
  ).toBeVisible();
  expect(booked(sent)).toEqual([]);
  await user.click(screen.getByRole('button', { name: 'Take BR-00403' }));
  await vi.waitFor(() => expect(onClose).toHaveBeenCalled());
  expect(booked(sent).map(({ body }) => body)).toEqual([
    { version: 4, key: 'BR-00401', partNumber: 'BR-00403', dryRun: false },
  ]);
  expect(await screen.findByText('Find 401: BR-00403 taken.')).toBeVisible();
  expect(screen.getByText('Undo')).toBeVisible();
});

it('keeps the choice when somebody changed the train meanwhile, and says what', async () => {
  const theirs = newTrain({ version: 7, buildQuantity: 30 });
  const { onClose, user } = show(({ body }) =>
    (body as { dryRun: boolean }).dryRun
      ? { body: result }
      : refusal(409, 'changed-meanwhile', 'Changed meanwhile.', { current: theirs }),
  );
  const radio = await screen.findByRole('radio', { name: /BR-00402.*here now/ });
  await user.click(radio);
  await user.click(await screen.findByRole('button', { name: 'Take BR-00402' }));
  expect(await screen.findByText(/Changed meanwhile: build quantity 1 → 30\./)).toBeVisible();
  expect(radio).toBeChecked();
  expect(onClose).not.toHaveBeenCalled();
});

it('offers to put the kit’s own part back on a line that was swapped', async () => {
  const line = newBomLine({
    partNumber: 'BR-00402',
    replaces: { partNumber: 'BR-00401', description: 'Deep-groove ball bearing' },
  });
  const { sent, user } = show(
    ({ body }) => ({
      body: (body as { dryRun: boolean }).dryRun ? result : { ...result, train: newTrain({ version: 5 }) },
    }),
    line,
  );
  await user.click(await screen.findByRole('radio', { name: 'Put the original part back: BR-00401' }));
  await screen.findByRole('table', { name: 'What changes' });
  await user.click(screen.getByRole('button', { name: 'Put the original part back' }));
  await screen.findByText('Find 401: the original part is back.');
  expect(booked(sent)[0]?.body).toMatchObject({ key: 'BR-00401', partNumber: null });
});

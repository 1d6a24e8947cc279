import { fireEvent, screen } from '@testing-library/react';
import { expect, it, vi } from 'vitest';
import type { Train } from '../../../api/types';
import { renderAt } from '../../../testing/renderAt';
import { pretendServer, refusal, type Answer } from '../../../testing/server';
import { ChoosePartDialog } from './ChoosePartDialog';

const gear = { teeth: 16, profileShift: 0, faceWidth: 18 };
const train = {
  code: 'T-0007',
  version: 4,
  spec: {
    pressureAngleDeg: 20,
    helixAngleDeg: 15,
    leastContactRatio: 1.2,
    shafts: [],
    stages: [
      {
        module: 1.5,
        centreDistance: 62.15,
        pinion: { ...gear, hand: 'right', partNumber: null },
        wheel: { ...gear, teeth: 64, hand: 'left', partNumber: null },
      },
      {
        module: 1.5,
        centreDistance: 51.28,
        pinion: { ...gear, hand: 'right', partNumber: null },
        wheel: { ...gear, teeth: 50, hand: 'left', partNumber: null },
      },
    ],
  },
} satisfies Pick<Train, 'code' | 'version' | 'spec'>;

const stock = (number: string, profileShift: number | undefined) => ({
  number,
  description: `Gear ${number}`,
  material: '16MnCr5',
  attributes: { faceWidth: 18, bore: 8, profileShift },
});

function show(patch: Answer, role: 'pinion' | 'wheel' = 'pinion') {
  const items = [stock('KW-00611', undefined), stock('KW-00612', 0), stock('KW-00613', 0.3)];
  const { sent } = pretendServer({
    'GET /api/parts': { body: { items, total: 3, page: 1, size: 100 } },
    'PATCH /api/trains/T-0007': patch,
  });
  const onClose = vi.fn();
  renderAt('/', '/', <ChoosePartDialog train={train} stage={1} role={role} onClose={onClose} />);
  return { sent, onClose };
}

it('offers the gears of the same hand and shift, and saves the choice for that gear alone', async () => {
  const { sent, onClose } = show({ body: train }, 'wheel');
  fireEvent.click(await screen.findByRole('radio', { name: /KW-00612/ }));
  // A gear whose shift nobody wrote down counts as one without; another shift is another gear.
  expect(screen.getByRole('radio', { name: /KW-00611/ })).toBeInTheDocument();
  expect(screen.queryByRole('radio', { name: /KW-00613/ })).toBeNull();
  expect(screen.getByText(/50 teeth, m 1.5, shift 0, helix 15° left, at least 18 mm wide/)).toBeVisible();
  const asked = new URL(sent[0]?.path ?? '', 'http://x').searchParams;
  expect(asked.get('hand')).toBe('left');
  expect(asked.get('helixAngleDeg')).toBe('15');
  expect(asked.get('standing')).toBe('cleared');
  fireEvent.click(screen.getByRole('button', { name: 'Choose' }));
  await vi.waitFor(() => expect(onClose).toHaveBeenCalled());
  expect(sent.find(({ method }) => method === 'PATCH')?.body).toEqual({
    version: 4,
    stages: [{}, { wheel: { partNumber: 'KW-00612' } }],
  });
});

it('stays open with the choice when the server refuses it, and says why', async () => {
  const message = 'KW-00611 was withdrawn; choose another part.';
  const { onClose } = show(
    refusal(400, 'bad-input', 'The part cannot be taken.', {
      errors: [{ field: 'stages.1.pinion.partNumber', value: 'KW-00611', message }],
    }),
  );
  fireEvent.click(await screen.findByRole('radio', { name: /KW-00611/ }));
  fireEvent.click(screen.getByRole('button', { name: 'Choose' }));
  expect(await screen.findByText(new RegExp(message))).toBeVisible();
  expect(screen.getByRole('radio', { name: /KW-00611/ })).toBeChecked();
  expect(onClose).not.toHaveBeenCalled();
});

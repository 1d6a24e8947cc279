import { expect, it } from 'vitest';
import type { Pin } from '../../api/types';
import { optionOf } from '../../testing/options';
import { shownPins, toggledPins } from './shownPins';

const pins: Pin[] = ['a', 'b', 'c', 'd', 'e'].map((key) => ({
  key,
  searchId: '1',
  option: optionOf([[20, 75]], { key }),
  pinnedAt: '2026-12-01T10:00:00.000Z',
  by: 'Dara Quill',
}));
const keys = (shown: Pin[]) => shown.map(({ key }) => key).join('');

it('shows the first four, or those the address names', () => {
  expect(keys(shownPins(pins, null))).toBe('abcd');
  expect(keys(shownPins(pins, 'e,b'))).toBe('be');
  expect(keys(shownPins(pins, 'gone'))).toBe('abcd');
});

it('lets the oldest give way to a fifth', () => {
  const shown = shownPins(pins, null);
  expect(toggledPins(shown, pins[4] as Pin)).toBe('b,c,d,e');
  expect(toggledPins(shown, pins[1] as Pin)).toBe('a,c,d');
});

import type { Pin } from '../../api/types';

/** Most options side by side. */
export const MOST_SHOWN = 4;

/** Which pins stand side by side: those the address names, else the first four. */
export function shownPins(pins: readonly Pin[], asked: string | null): Pin[] {
  const keys = (asked ?? '').split(',').filter((key) => key !== '');
  const named = pins.filter(({ key }) => keys.includes(key));
  return (named.length > 0 ? named : pins).slice(0, MOST_SHOWN);
}

/** The address's list after one pin was switched on or off; at most four stay, the oldest gives way. */
export function toggledPins(shown: readonly Pin[], pin: Pin): string {
  const keys = shown.map(({ key }) => key);
  const next = keys.includes(pin.key) ? keys.filter((key) => key !== pin.key) : [...keys, pin.key];
  return next.slice(-MOST_SHOWN).join(',');
}

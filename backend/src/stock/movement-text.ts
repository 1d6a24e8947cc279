import type { MovementDto } from './dto/movement.dto.js';

/** What was done, in words that follow a person's name: `issued 3 pcs`. */
export function movementText({ kind, change, counted, unit }: MovementDto): string {
  const figure = (quantity: number) => quantity.toLocaleString('en-GB', { maximumFractionDigits: 3 });
  if (kind === 'counted') return `counted ${figure(counted ?? 0)} ${unit}`;
  if (kind === 'corrected') {
    return change > 0 ? `added ${figure(change)} ${unit}` : `took off ${figure(-change)} ${unit}`;
  }
  return `${kind} ${figure(Math.abs(change))} ${unit}`;
}

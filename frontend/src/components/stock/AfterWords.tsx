import Typography from '@mui/material/Typography';
import type { DeepPartial } from 'react-hook-form';
import type { StockItem } from '../../api/types';
import { numberOrNull } from '../NumberField';
import { levelAt, type MovementForm } from './movementForm';
import { changeWords, quantityWords } from './stockWords';

/** What lies at the place now, and what will after it is booked. */
export function AfterWords({ item, form }: { item: StockItem | undefined; form: DeepPartial<MovementForm> }) {
  const place = (form.place ?? '').trim();
  if (item === undefined || place === '') return null;
  const level = levelAt(item, place);
  const there = level?.quantity ?? 0;
  const quantity = numberOrNull(form.quantity);
  const words = (figure: number) => quantityWords(figure, item.unit);
  const now = level ? `${words(there)} at ${level.place}` : `None of it at ${place} so far`;
  return (
    <Typography color="textSecondary" role="status">
      {now}
      {quantity !== null && afterWords(form.kind, there, quantity, words)}
    </Typography>
  );
}

function afterWords(
  kind: MovementForm['kind'] | undefined,
  there: number,
  quantity: number,
  words: (figure: number) => string,
): string {
  if (kind === 'counted') return `; the count changes it by ${changeWords(quantity - there)}.`;
  const after = kind === 'issued' ? there - quantity : there + quantity;
  return after < 0 ? '; that is not enough.' : `; ${words(after)} afterwards.`;
}

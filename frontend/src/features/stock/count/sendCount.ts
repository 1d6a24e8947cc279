import { answer, api } from '../../../api/client';
import { bookMovement } from '../../../api/hooks/useStockItem';
import { Problem } from '../../../api/problem';
import type { Movement } from '../../../api/types';
import { quantityWords } from '../../../components/stock/stockWords';
import type { Count } from './countTypes';

/**
 * Books one count.
 * @throws Problem as the server refuses it; 409 `changed-meanwhile` when the shelf changed after it was counted
 */
export async function sendCount(count: Count): Promise<Movement> {
  const { key, number, place, counted } = count;
  const seenMovementId = count.seenMovementId ?? (await latestBefore(count));
  return bookMovement({
    number,
    kind: 'counted',
    quantity: counted,
    place,
    reason: '',
    requestKey: key,
    seenMovementId,
  });
}

/**
 * The movement that a count made without a network stood on: the latest one, if it is older than the count.
 * A newer one would be counted away.
 */
async function latestBefore({ number, place, at }: Count): Promise<number> {
  const query = { part: number, place, size: 1 };
  const { items } = await answer(api.GET('/api/stock/movements', { params: { query } }));
  const [last] = items;
  if (last === undefined) return 0;
  if (last.at <= at) return last.id;
  const message =
    `After you counted, something was booked at ${last.place}: now the books say ` +
    `${quantityWords(last.after, last.unit)}. Look again at what is there.`;
  const level = { place: last.place, quantity: last.after, lastMovementId: last.id };
  throw new Problem(409, 'changed-meanwhile', message, [], null, { places: [level] });
}

import useSWR, { mutate } from 'swr';
import { answer, api } from '../client';
import { asProblem } from '../problem';
import type { Movement, MovementInput, StockItem } from '../types';
import { readAgain } from './readAgain';

const keyOf = (number: string) => ['/api/stock/items/{number}', number.toUpperCase()] as const;

/** @throws Problem 404 */
export function readStockItem(number: string, signal?: AbortSignal): Promise<StockItem> {
  const options = { params: { path: { number } }, ...(signal ? { signal } : {}) };
  return answer(api.GET('/api/stock/items/{number}', options));
}

/** The shelf of one part; null asks for nothing. */
export function useStockItem(number: string | null) {
  const {
    data,
    error,
    isLoading,
    mutate: refresh,
  } = useSWR<StockItem, unknown, ReturnType<typeof keyOf> | null>(
    number === null || number === '' ? null : keyOf(number),
    () => readStockItem(number ?? ''),
    {
      shouldRetryOnError: false,
    },
  );
  return {
    item: data,
    problem: error === undefined ? null : asProblem(error),
    isLoading,
    mutate: refresh,
  };
}

/** Puts a shelf the server has just sent in front of every screen that shows it, and has the lists read again. */
export async function keepStockItem(item: StockItem): Promise<void> {
  await mutate(keyOf(item.number), item, { revalidate: false });
  readShelvesAgain();
}

/** Has every list that shows shelf quantities read again. */
export function readShelvesAgain(): void {
  readAgain('/api/stock', '/api/stock/movements', '/api/stock/places', '/api/parts');
}

/** @throws Problem 400 naming the fields; 409 with the shelf as `current` */
export async function bookMovement(input: MovementInput): Promise<Movement> {
  const movement = await answer(api.POST('/api/stock/movements', { body: input }));
  await mutate(keyOf(movement.number));
  readShelvesAgain();
  return movement;
}

/** @throws Problem 400 naming the field; 409 `changed-meanwhile` with the shelf as `current` */
export async function setLeastStock(
  number: string,
  leastStock: number | null,
  version: number,
): Promise<StockItem> {
  const options = { params: { path: { number } }, body: { leastStock, version } };
  const item = await answer(api.PUT('/api/stock/items/{number}/least', options));
  await keepStockItem(item);
  return item;
}

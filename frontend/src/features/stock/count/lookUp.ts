import { readStockItem } from '../../../api/hooks/useStockItem';
import { asProblem, type Problem } from '../../../api/problem';
import type { StockItem } from '../../../api/types';
import { type KeptItem, keptItem } from './shelfCache';

/** A part that was scanned or typed. */
export interface FoundPart {
  number: string;
  description: string;
  unit: StockItem['unit'];
  expected: number | null;
  seenMovementId: number | null;
}

/** A hand on a number pad does not wait longer, ms; then what the device keeps must do. */
const PATIENCE = 4000;

/**
 * Looks a part up at a place: by the server, or by what the device keeps while the network is away. A part that neither
 * knows can still be counted; the server checks its number once the count is sent.
 */
export async function lookUp(place: string, number: string): Promise<FoundPart | Problem> {
  try {
    return found(await readStockItem(number, AbortSignal.timeout(PATIENCE)), place);
  } catch (error) {
    const problem = asProblem(error);
    if (!problem.noAnswer) return problem;
    const kept = keptItem(place, number);
    if (kept) return found(kept, place);
    return {
      number: number.toUpperCase(),
      description: '',
      unit: 'pcs',
      expected: null,
      seenMovementId: null,
    };
  }
}

function found({ number, description, unit, places }: KeptItem, place: string): FoundPart {
  const level = places.find((each) => each.place.toLowerCase() === place.toLowerCase());
  return {
    number,
    description,
    unit,
    expected: level?.quantity ?? 0,
    seenMovementId: level?.lastMovementId ?? 0,
  };
}

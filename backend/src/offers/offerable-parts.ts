import { type EntityManager } from 'typeorm';
import { type OfferablePart } from './offer-content.js';

/**
 * The parts of these numbers, in one query, by their numbers in small letters.
 * @param numbers whatever the case of their letters; those that name no part are not in the map
 */
export async function offerableParts(
  manager: EntityManager,
  numbers: readonly string[],
): Promise<Map<string, OfferablePart & { description: string }>> {
  const rows = await manager.query<(OfferablePart & { description: string })[]>(
    `SELECT "id", "number", "kind", "standing", "successorNumber", "description" FROM "part"
     WHERE "number" IN (SELECT "value" FROM json_each(?))`,
    [JSON.stringify([...new Set(numbers)])],
  );
  return new Map(rows.map((part) => [part.number.toLowerCase(), part]));
}

import { type EntityManager } from 'typeorm';
import { type PriceBreak } from '@stageyard/libs/bill-of-materials';
import { type Supplier } from '../../suppliers/entities/supplier.entity.js';
import { type Offer } from '../entities/offer.entity.js';
import { type OfferablePart } from '../offer-content.js';
import { offerableParts } from '../offerable-parts.js';
import { type StatedRow } from './read-row.js';

export type PastedPart = OfferablePart & { description: string };

/** What pasted rows are held against. */
export interface PasteGround {
  supplier: Supplier;
  /** By the part number in small letters. */
  parts: ReadonlyMap<string, PastedPart>;
  /** Parts that the supplier offered under a number of its own, by that number in small letters. */
  bySupplierNumber: ReadonlyMap<string, readonly PastedPart[]>;
  /** The supplier's open offers that have not ended, by the id of the part. */
  offers: ReadonlyMap<number, readonly Offer[]>;
  /** ISO 8601 date. */
  today: string;
}

/**
 * Reads what the rows name: three queries, however many rows there are.
 * @param pause called after each, so that others get their turn
 */
export async function readGround(
  manager: EntityManager,
  supplier: Supplier,
  rows: readonly StatedRow[],
  today: string,
  pause: () => Promise<void>,
): Promise<PasteGround> {
  const parts = await offerableParts(
    manager,
    rows.map(({ partNumber }) => partNumber),
  );
  await pause();
  const bySupplierNumber = await partsOffered(
    manager,
    supplier,
    rows.filter(({ partNumber }) => partNumber === '').map((row) => row.supplierPartNumber),
  );
  await pause();
  const named = [...parts.values(), ...[...bySupplierNumber.values()].flat()];
  const offers = await openOffers(manager, supplier, named, today);
  await pause();
  return { supplier, parts, bySupplierNumber, offers, today };
}

async function partsOffered(
  manager: EntityManager,
  supplier: Supplier,
  numbers: readonly string[],
): Promise<Map<string, PastedPart[]>> {
  if (numbers.length === 0) return new Map();
  const rows = await manager.query<(PastedPart & { offeredAs: string })[]>(
    `SELECT DISTINCT lower("o"."supplierPartNumber") AS "offeredAs", "p"."id", "p"."number", "p"."kind",
            "p"."standing", "p"."successorNumber", "p"."description"
     FROM "offer" "o" JOIN "part" "p" ON "p"."id" = "o"."partId"
     WHERE "o"."supplierId" = ? AND "o"."supplierPartNumber" IN (SELECT "value" FROM json_each(?))`,
    [supplier.id, JSON.stringify([...new Set(numbers)])],
  );
  return grouped(rows, ({ offeredAs }) => offeredAs.toLowerCase());
}

async function openOffers(
  manager: EntityManager,
  supplier: Supplier,
  parts: readonly PastedPart[],
  today: string,
): Promise<Map<number, Offer[]>> {
  const rows = await manager.query<(Omit<Offer, 'breaks'> & { breaks: string })[]>(
    `SELECT * FROM "offer"
     WHERE "supplierId" = ? AND "partId" IN (SELECT "value" FROM json_each(?)) AND "standing" = 'open'
       AND ("validUntil" IS NULL OR "validUntil" >= ?)
     ORDER BY "id"`,
    [supplier.id, JSON.stringify([...new Set(parts.map(({ id }) => id))]), today],
  );
  const offers = rows.map((row): Offer => ({ ...row, breaks: JSON.parse(row.breaks) as PriceBreak[] }));
  return grouped(offers, ({ partId }) => partId);
}

function grouped<T, K>(things: readonly T[], keyOf: (thing: T) => K): Map<K, T[]> {
  const groups = new Map<K, T[]>();
  for (const thing of things) {
    const known = groups.get(keyOf(thing));
    if (known) known.push(thing);
    else groups.set(keyOf(thing), [thing]);
  }
  return groups;
}

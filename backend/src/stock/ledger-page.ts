import type { EntityManager } from 'typeorm';
import { notFound } from '../common/errors.js';
import { Part } from '../parts/entities/part.entity.js';
import { isAscii, placeKey, plainPlace } from './place-name.js';
import { StockMovement } from './entities/stock-movement.entity.js';

/** What the ledger needs to know of a part. */
export type LedgerPart = Pick<Part, 'id' | 'number' | 'description' | 'kind'>;

/** How one place of one part stands; thousandths of the unit. */
export interface PlaceStanding {
  quantity: number;
  /** 0 when nothing was ever booked there. */
  lastMovementId: number;
}

const NOTHING: PlaceStanding = { quantity: 0, lastMovementId: 0 };

/**
 * The ledger as one transaction sees it. What it read it remembers, since nobody else writes meanwhile: many movements
 * cost one insert each. Never keep it beyond its transaction.
 */
export class LedgerPage {
  readonly #parts = new Map<string, LedgerPart>();
  readonly #places = new Map<string, string>();
  readonly #standings = new Map<string, PlaceStanding>();

  constructor(readonly manager: EntityManager) {}

  /** @throws ProblemError 404 */
  async part(number: string): Promise<LedgerPart> {
    const key = number.trim().toLowerCase();
    const part =
      this.#parts.get(key) ??
      (await this.manager.findOne(Part, {
        where: { number: number.trim() },
        select: { id: true, number: true, description: true, kind: true },
      }));
    if (!part) throw notFound('part', number);
    this.#parts.set(key, part);
    return part;
  }

  /** The place as it was written first: “rack b 3” is Rack B 3 wherever parts lie there already. */
  async placeName(written: string): Promise<string> {
    const place = plainPlace(written);
    const key = placeKey(place);
    const known = this.#places.get(key) ?? (await this.placeOf(place)) ?? place;
    this.#places.set(key, known);
    return known;
  }

  private async placeOf(place: string): Promise<string | undefined> {
    const found = await this.manager.query<{ place: string }[]>(
      'SELECT "place" FROM "stock_level" WHERE "place" = ? LIMIT 1',
      [place],
    );
    if (found[0] || isAscii(place)) return found[0]?.place;
    const all = await this.manager.query<{ place: string }[]>(EVERY_PLACE);
    return all.find((other) => placeKey(other.place) === placeKey(place))?.place;
  }

  async standing(part: LedgerPart, place: string): Promise<PlaceStanding> {
    const key = standingKey(part, place);
    const known =
      this.#standings.get(key) ??
      (
        await this.manager.query<PlaceStanding[]>(
          'SELECT "quantity", "lastMovementId" FROM "stock_level" WHERE "partId" = ? AND "place" = ?',
          [part.id, place],
        )
      )[0] ??
      NOTHING;
    this.#standings.set(key, known);
    return known;
  }

  /** The movement that this request booked before. */
  bookedBy(requestKey: string): Promise<StockMovement | null> {
    return this.manager.findOneBy(StockMovement, { requestKey });
  }

  /** Writes one movement; the database brings the level up to date by itself. */
  async add(
    part: LedgerPart,
    movement: Omit<StockMovement, 'id' | 'partId' | 'part'>,
  ): Promise<StockMovement> {
    const { kind, change, counted, after, place, reason, at, actorId, actorName, requestKey } = movement;
    const [row] = await this.manager.query<{ id: number }[]>(INSERT, [
      part.id,
      ...[kind, change, counted, after, place, reason, at, actorId, actorName, requestKey],
    ]);
    if (!row) throw new Error('The database gave the movement no id.');
    this.#standings.set(standingKey(part, place), { quantity: after, lastMovementId: row.id });
    return { ...movement, id: row.id, partId: part.id };
  }
}

/** Every place: one look into the index for each, however much lies there. */
const EVERY_PLACE = `
  WITH RECURSIVE "known"("place") AS (
    SELECT MIN("place") FROM "stock_level"
    UNION ALL
    SELECT (SELECT MIN("place") FROM "stock_level" WHERE "place" > "known"."place")
    FROM "known" WHERE "known"."place" IS NOT NULL
  )
  SELECT "place" FROM "known" WHERE "place" IS NOT NULL`;

const INSERT = `INSERT INTO "stock_movement"
  ("partId", "kind", "change", "counted", "after", "place", "reason", "at", "actorId", "actorName", "requestKey")
  VALUES (?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?) RETURNING "id"`;

function standingKey({ id }: LedgerPart, place: string): string {
  return `${id} ${placeKey(place)}`;
}

import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource, type EntityManager } from 'typeorm';
import type { StockPlaceDto } from './dto/stock-place.dto.js';
import { fromThousandths } from './thousandths.js';

/** What lies on the shelf of one part, in its unit. */
export interface ShelfLevels {
  total: number;
  places: StockPlaceDto[];
}

interface LevelRow {
  key: string | number;
  place: string;
  quantity: number;
  lastMovementId: number;
  countedAt: string | null;
}

const COLUMNS = `level."place" AS "place", level."quantity" AS "quantity",
  level."lastMovementId" AS "lastMovementId", level."countedAt" AS "countedAt"`;

/** What lies where, for many parts at once. Others read the shelf here. */
@Injectable()
export class StockLevels {
  constructor(@InjectDataSource() private readonly source: DataSource) {}

  /**
   * The shelf of many parts, in one query.
   * @param partNumbers whatever their case
   * @returns by part number as the library writes it; parts that never lay anywhere are not in it
   */
  async ofParts(
    partNumbers: Iterable<string>,
    manager: EntityManager = this.source.manager,
  ): Promise<Map<string, ShelfLevels>> {
    const rows = await manager.query<(LevelRow & { key: string })[]>(
      `SELECT part."number" AS "key", ${COLUMNS}
        FROM "part" part JOIN "stock_level" level ON level."partId" = part."id"
        WHERE part."number" IN (SELECT "value" FROM json_each(?))
        ORDER BY part."number", level."place"`,
      [JSON.stringify([...new Set(partNumbers)])],
    );
    return gathered(rows);
  }

  /** As `ofParts`, by the ids of the rows. */
  async ofPartIds(
    partIds: readonly number[],
    manager: EntityManager = this.source.manager,
  ): Promise<Map<number, ShelfLevels>> {
    const rows = await manager.query<(LevelRow & { key: number })[]>(
      `SELECT level."partId" AS "key", ${COLUMNS} FROM "stock_level" level
        WHERE level."partId" IN (SELECT "value" FROM json_each(?))
        ORDER BY level."partId", level."place"`,
      [JSON.stringify(partIds)],
    );
    return gathered(rows);
  }

  /** What lies on the shelf of one part over all places; null when it never lay anywhere. */
  async totalOf(partId: number, manager?: EntityManager): Promise<number | null> {
    return (await this.ofPartIds([partId], manager)).get(partId)?.total ?? null;
  }
}

function gathered<Key extends string | number>(rows: (LevelRow & { key: Key })[]): Map<Key, ShelfLevels> {
  const shelves = new Map<Key, LevelRow[]>();
  for (const row of rows) {
    const known = shelves.get(row.key);
    if (known) known.push(row);
    else shelves.set(row.key, [row]);
  }
  return new Map([...shelves].map(([key, levels]) => [key, toShelf(levels)]));
}

function toShelf(levels: LevelRow[]): ShelfLevels {
  return {
    // Whole thousandths are added before they become a figure with decimals: the sum is exact.
    total: fromThousandths(levels.reduce((sum, { quantity }) => sum + quantity, 0)),
    places: levels.map(({ place, quantity, lastMovementId, countedAt }) => ({
      place,
      quantity: fromThousandths(quantity),
      lastMovementId,
      countedAt,
    })),
  };
}

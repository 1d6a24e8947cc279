import type { SelectQueryBuilder } from 'typeorm';
import { plainPlace } from './place-name.js';
import type { Part } from '../parts/entities/part.entity.js';

/** What lies of a part over all places, thousandths of its unit; over the alias `part`. */
export const ON_SHELF =
  '(SELECT COALESCE(SUM("level"."quantity"), 0) FROM "stock_level" "level" WHERE "level"."partId" = part.id)';

const AT_PLACE = 'part.id IN (SELECT "partId" FROM "stock_level" WHERE "place" = :place)';
const ANYWHERE = 'EXISTS (SELECT 1 FROM "stock_level" "level" WHERE "level"."partId" = part.id)';

/** Narrows a query over parts to those that lay at a place, or anywhere, or are watched. */
export function isOnShelf(rows: SelectQueryBuilder<Part>, place?: string): void {
  if (place) rows.andWhere(AT_PLACE, { place: plainPlace(place) });
  else rows.andWhere(`(part.leastStock IS NOT NULL OR ${ANYWHERE})`);
}

/** Narrows a query over parts to those of which something lies on the shelf now. */
export function hasStock(rows: SelectQueryBuilder<Part>): void {
  rows.andWhere('part.id IN (SELECT "partId" FROM "stock_level" WHERE "quantity" > 0)');
}

/** Narrows a query over parts to those below their least stock. */
export function isLow(rows: SelectQueryBuilder<Part>): void {
  rows.andWhere(`part.leastStock IS NOT NULL AND ${ON_SHELF} < part.leastStock`);
}

import { addDays, type OfferState } from '@stageyard/libs/bill-of-materials';
import { type SelectQueryBuilder } from 'typeorm';
import { containing } from '../common/like-text.js';
import { type SortKey } from '../common/list-query.js';
import { HOUSE_RULES } from '../house-rules/house-rules.js';
import { type OfferQueryDto, type OfferSort } from './dto/offer-query.dto.js';
import { type Offer } from './entities/offer.entity.js';

/** Words beyond these are left out of account: they would only slow the search down. */
const MOST_WORDS = 8;

/** The trigram index of parts finds words of at least three characters. */
const SHORTEST_INDEXED = 3;

const LASTS = '(offer.validUntil IS NULL OR offer.validUntil >= :today)';

/** The same as `offerState` of the library, as the database says it. */
const IN_STATE: Record<OfferState, string> = {
  closed: "offer.standing = 'closed'",
  'not-yet': "offer.standing = 'open' AND offer.validFrom > :today",
  expired: "offer.standing = 'open' AND offer.validFrom <= :today AND offer.validUntil < :today",
  valid: `offer.standing = 'open' AND offer.validFrom <= :today AND ${LASTS}`,
};

/** Narrows a query over offers (alias `offer`). @param today ISO 8601 date, for states and ages */
export function narrowOffers(
  rows: SelectQueryBuilder<Offer>,
  query: OfferQueryDto,
  text: string | null,
  today: string,
): void {
  rows.setParameter('today', today);
  const { supplier, part, currency, state, tooOld, endsBy } = query;
  if (supplier !== undefined) {
    const code = supplier.trim().toUpperCase();
    rows.andWhere('offer.supplierId = (SELECT "id" FROM "supplier" WHERE "code" = :code)', { code });
  }
  if (part !== undefined) {
    rows.andWhere('offer.partId = (SELECT "id" FROM "part" WHERE "number" = :number)', {
      number: part.trim(),
    });
  }
  if (currency !== undefined) {
    rows.andWhere('offer.currency = :currency', { currency: currency.trim().toUpperCase() });
  }
  if (state !== undefined) rows.andWhere(IN_STATE[state]);
  if (tooOld !== undefined) {
    // A price is too old once its age is above the rule: the day of the rule itself is still good.
    rows.andWhere(tooOld ? 'offer.pricedOn < :oldest' : 'offer.pricedOn >= :oldest', {
      oldest: addDays(today, -HOUSE_RULES.priceAgeDays),
    });
  }
  if (endsBy !== undefined) {
    rows.andWhere(IN_STATE.valid).andWhere('offer.validUntil <= :endsBy', { endsBy });
  }
  if (text !== null) narrowToText(rows, text);
}

/** Every word must stand somewhere: in the part, the supplier or the supplier's part number. */
function narrowToText(rows: SelectQueryBuilder<Offer>, text: string): void {
  const words = text.split(/[\s\p{Cc}]+/u).filter(Boolean);
  if (words.length === 0) rows.andWhere('0 = 1');
  words.slice(0, MOST_WORDS).forEach((word, index) => {
    const like = `LIKE :word${index} ESCAPE '\\'`;
    const indexed = [...word].length >= SHORTEST_INDEXED;
    const parts = indexed
      ? `SELECT "rowid" FROM "part_search" WHERE "part_search" MATCH :match${index}`
      : `SELECT "id" FROM "part" WHERE "number" ${like} OR "description" ${like}`;
    const suppliers = `SELECT "id" FROM "supplier" WHERE "code" ${like} OR "name" ${like}`;
    rows.andWhere(
      `(offer.supplierPartNumber ${like} OR offer.partId IN (${parts}) OR offer.supplierId IN (${suppliers}))`,
      {
        [`word${index}`]: containing(word),
        ...(indexed ? { [`match${index}`]: `"${word.replaceAll('"', '""')}"` } : {}),
      },
    );
  });
}

/** Sorts, with the id as the last key so that pages never overlap. What is not known comes last, both ways. */
export function orderOffers(rows: SelectQueryBuilder<Offer>, sorts: readonly SortKey<OfferSort>[]): void {
  const keys: readonly SortKey<OfferSort>[] =
    sorts.length > 0 ? sorts : [{ field: 'updatedAt', direction: 'DESC' }];
  for (const { field, direction } of keys) {
    switch (field) {
      case 'part':
        rows.innerJoin('offer.part', 'part').addOrderBy('part.number', direction);
        break;
      case 'supplier':
        rows.innerJoin('offer.supplier', 'supplier').addOrderBy('supplier.name', direction);
        break;
      case 'leadTimeDays':
        rows.innerJoin('offer.supplier', 'usual');
        rows.addOrderBy('COALESCE(offer.leadTimeDays, usual.leadTimeDays)', direction, 'NULLS LAST');
        break;
      case 'validUntil':
        rows.addOrderBy('offer.validUntil', direction, 'NULLS LAST');
        break;
      default:
        rows.addOrderBy(`offer.${field}`, direction);
    }
  }
  rows.addOrderBy('offer.id', keys.at(-1)?.direction ?? 'ASC');
}

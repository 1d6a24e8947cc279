import { Injectable } from '@nestjs/common';
import { type OfferCandidate, type PriceBreak } from '@stageyard/libs/bill-of-materials';
import { DataSource, type EntityManager } from 'typeorm';
import { type SupplierStanding } from '../suppliers/supplier-terms.js';
import { type OfferStanding, type PricePer } from './offer-terms.js';

/** An offer ready to be priced and chosen among others. */
export interface PartOffer extends OfferCandidate {
  supplierCode: string;
  supplierPartNumber: string;
}

interface CandidateRow {
  partNumber: string;
  id: number;
  supplierCode: string;
  supplierName: string;
  supplierStanding: SupplierStanding;
  supplierLeadTimeDays: number | null;
  supplierPartNumber: string;
  standing: OfferStanding;
  currency: string;
  per: PricePer;
  breaks: string;
  pack: number;
  leastQuantity: number;
  leadTimeDays: number | null;
  validFrom: string;
  validUntil: string | null;
  pricedOn: string;
}

/** Finds what is offered for many parts at once; never one query a part. */
@Injectable()
export class OffersFinder {
  constructor(private readonly source: DataSource) {}

  /**
   * Every offer of each part, closed and expired ones too, by the part numbers as they were asked for, whatever the
   * case of their letters. Parts without offers, and numbers that name no part, are not in the map.
   */
  async forParts(
    numbers: readonly string[],
    manager: EntityManager = this.source.manager,
  ): Promise<Map<string, PartOffer[]>> {
    const asked = [...new Set(numbers)];
    const byKey = new Map<string, PartOffer[]>();
    for (const row of await this.rowsOf(manager, asked)) {
      const key = keyOf(row.partNumber);
      const known = byKey.get(key);
      if (known) known.push(toCandidate(row));
      else byKey.set(key, [toCandidate(row)]);
    }
    const found = new Map<string, PartOffer[]>();
    for (const number of asked) {
      const candidates = byKey.get(keyOf(number));
      if (candidates) found.set(number, candidates);
    }
    return found;
  }

  private rowsOf(manager: EntityManager, numbers: string[]): Promise<CandidateRow[]> {
    return manager.query<CandidateRow[]>(
      `SELECT "p"."number" AS "partNumber", "o"."id", "s"."code" AS "supplierCode", "s"."name" AS "supplierName",
              "s"."standing" AS "supplierStanding", "s"."leadTimeDays" AS "supplierLeadTimeDays",
              "o"."supplierPartNumber", "o"."standing", "o"."currency", "o"."per", "o"."breaks", "o"."pack",
              "o"."leastQuantity", "o"."leadTimeDays", "o"."validFrom", "o"."validUntil", "o"."pricedOn"
       FROM "part" "p"
       JOIN "offer" "o" ON "o"."partId" = "p"."id"
       JOIN "supplier" "s" ON "s"."id" = "o"."supplierId"
       WHERE "p"."number" IN (SELECT "value" FROM json_each(?))
       ORDER BY "o"."id"`,
      [JSON.stringify(numbers.map(keyOf))],
    );
  }
}

/** Part numbers are letters A–Z and digits: the database takes capitals and small letters for the same, as this does. */
function keyOf(number: string): string {
  return number.trim().toLowerCase();
}

function toCandidate({ partNumber: _, id, breaks, ...row }: CandidateRow): PartOffer {
  return { ...row, id: String(id), breaks: JSON.parse(breaks) as PriceBreak[] };
}

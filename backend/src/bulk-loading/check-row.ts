import { checkedInput, quickCheck } from '../common/quick-check.js';
import { type OfferContent } from '../offers/offer-changes.js';
import { OfferInputDto } from '../offers/dto/offer-input.dto.js';
import { PriceBreakDto } from '../offers/dto/price-break.dto.js';
import { resolvedOffer } from '../offers/resolved-offer.js';
import { checkAttributes } from '../parts/check-attributes.js';
import { PartInputDto } from '../parts/dto/part-input.dto.js';
import { type NewPart, newPart } from '../parts/new-part.js';
import { unitOf } from '../parts/part-unit.js';
import { LeastStockInputDto } from '../stock/dto/least-stock-input.dto.js';
import { MovementInputDto } from '../stock/dto/movement-input.dto.js';
import { askedMovement } from '../stock/movement-change.js';
import { plainPlace } from '../stock/place-name.js';
import { toThousandths } from '../stock/thousandths.js';
import { type Supplier } from '../suppliers/entities/supplier.entity.js';
import { underPath } from '../common/under-path.js';
import { type BulkRow, type OpeningCount } from './bulk-row.js';

/** A row that may be booked as it stands. */
export interface CheckedRow {
  /** Null: the next running number. */
  number: string | null;
  part: NewPart;
  offers: { supplierId: number; content: OfferContent }[];
  opening: { place: string; thousandths: number } | null;
}

/** Suppliers by code. */
export type KnownSuppliers = ReadonlyMap<string, Supplier>;

const QUICK = {
  part: quickCheck(PartInputDto),
  offer: quickCheck(OfferInputDto, { breaks: quickCheck(PriceBreakDto) }),
  movement: quickCheck(MovementInputDto),
  leastStock: quickCheck(LeastStockInputDto),
};

/** Stands for the number that a part gets only when it is booked. */
const LATER = 'later';

/**
 * Judges one row exactly as its part, its offers and its count would be judged one by one.
 * @param today ISO 8601 date
 * @throws ProblemError or InputError listing the fields at fault: `part.…`, `offers.<index>.…`, `opening.…`
 */
export function checkRow(row: BulkRow, suppliers: KnownSuppliers, today: string): CheckedRow {
  const { input, part } = underPath('part', () => checkPart(row.part));
  const number = input.number?.trim() || null;
  const owner = { id: 0, number: number ?? LATER, ...part };
  const offers = (row.offers ?? []).map((raw, index) =>
    underPath(`offers.${index}`, () => {
      const offer = checkedInput(OfferInputDto, QUICK.offer, { ...raw, partNumber: owner.number });
      const known = suppliers.get(offer.supplierCode.toUpperCase());
      const { supplier, content } = resolvedOffer(offer, owner, known, today);
      return { supplierId: supplier.id, content };
    }),
  );
  part.leastStock = underPath('', () => checkLeastStock(row.leastStock ?? null, part));
  const { opening } = row;
  return {
    number,
    part,
    offers,
    opening: opening ? underPath('opening', () => checkOpening(opening, owner)) : null,
  };
}

function checkPart(raw: PartInputDto): { input: PartInputDto; part: NewPart } {
  const input = checkedInput(PartInputDto, QUICK.part, raw);
  return { input, part: newPart(input, checkAttributes(input.kind, input.attributes)) };
}

function checkLeastStock(leastStock: number | null, { kind }: NewPart): number | null {
  checkedInput(LeastStockInputDto, QUICK.leastStock, { leastStock, version: 1 });
  return leastStock === null ? null : toThousandths(leastStock, unitOf(kind), 'leastStock');
}

function checkOpening(
  { place, quantity }: OpeningCount,
  part: NewPart & { id: number; number: string },
): NonNullable<CheckedRow['opening']> {
  const raw = { number: part.number, kind: 'counted', place, quantity };
  const input = checkedInput(MovementInputDto, QUICK.movement, raw);
  return { place: plainPlace(input.place), thousandths: askedMovement(part, input).amount };
}

import { type OfferInputDto } from '@stageyard/backend/offers/dto/offer-input.dto';
import { addDays } from '@stageyard/libs/bill-of-materials';
import { type LibraryRow } from './library.js';
import { salesFormOf, sellersOf, STEP_FACTORS } from './offer-terms-of.js';
import { type Random, randomOf } from './random.js';
import { SUPPLIER, type SupplierName } from './supplier-names.js';
import { worthOf } from './worth.js';

/** An offer that still wants the codes under which part and supplier were booked. */
export type OfferRow = Omit<OfferInputDto, 'partNumber' | 'supplierCode'> & { supplier: SupplierName };

interface Seller {
  currency: string;
  /** Minor units for one EUR of worth: our own figures, no rates of exchange. */
  minorPerEuro: number;
  /** Begins the supplier's part numbers. */
  mark: string;
  leastPieces: number;
  sources: readonly string[];
}

const SELLERS: Record<SupplierName, Seller> = {
  [SUPPLIER.marrow]: seller('EUR', 104, 'MS', 1, [
    'Price list, sheet 3',
    'Quotation 20417',
    'Quotation 20988',
  ]),
  [SUPPLIER.tidewrack]: seller('EUR', 109, 'T', 1, ['Preisliste Lager', 'Angebot 7714', 'Angebot 8102']),
  [SUPPLIER.larkspit]: seller('GBP', 88, 'LB/', 5, ['Quotation Q318', 'Quotation Q355', 'Call with Sales']),
  [SUPPLIER.corrie]: seller('EUR', 98, 'CL ', 1, [
    'Counter price list',
    'Offer 1190',
    'Asked at the counter',
  ]),
  [SUPPLIER.asanagi]: seller('JPY', 171, 'AG', 2, ['Mitsumori 4471', 'Mitsumori 4620']),
  [SUPPLIER.lazuli]: seller('TND', 3150, 'CZ.', 4, ['Devis 0932', 'Devis 1017']),
};

/** Lines of the demo trains that show what a bill of materials says of prices too old, and of none at all. */
const TOO_OLD = 'Spur gear, steel, 66 teeth, module 1.5';
const WITHOUT = 'Spur gear, steel, 72 teeth, module 1.5';

/** Lines of the demo trains that only one firm sells, in another currency than the rest. */
const ONE_SELLER: Record<string, SupplierName> = {
  'Rotary shaft seal 8 × 22 × 7 mm': SUPPLIER.larkspit,
  'Helical gear, hardened steel, 50 teeth, module 1.5, right hand 15°': SUPPLIER.asanagi,
};

/**
 * What suppliers ask for a part, the same amounts at every loading.
 * @param index place in the library, from 0; supplier's part numbers come from it
 * @param today ISO 8601 date; days of the offers are counted back from it
 */
export function offersOf(row: LibraryRow, index: number, today: string): OfferRow[] {
  const random = randomOf(`offers for ${row.description}`);
  if (row.standing === 'withdrawn' || row.description === WITHOUT) return [];
  const names = namesOf(row, random);
  return names.flatMap((name) => {
    const one = randomOf(`${name} offers ${row.description}`);
    const now = offer(row, index, name, one);
    if (row.description === TOO_OLD) return [{ ...now, ...daysOf(today, 262, null) }];
    if (row.description in ONE_SELLER) return [{ ...now, ...daysOf(today, 41, 300) }];
    return [{ ...now, ...usualDays(one, today) }, ...otherYears(row, index, name, one, today)];
  });
}

/** A few parts nobody offers, most one firm, some two or three. */
function namesOf(row: LibraryRow, random: Random): SupplierName[] {
  const only = ONE_SELLER[row.description];
  if (only !== undefined) return [only];
  const sellers = sellersOf(row);
  if (row.description === TOO_OLD) return sellers.slice(0, 1);
  if (random.chance(0.025)) return [];
  const count = random.chance(0.55) ? 1 : random.chance(0.75) ? 2 : 3;
  return sellers.slice(0, count);
}

function offer(row: LibraryRow, index: number, name: SupplierName, random: Random, dearer = 1): OfferRow {
  const { currency, minorPerEuro, mark, leastPieces, sources } = SELLERS[name];
  const { per, pack, steps } = salesFormOf(row);
  const one = worthOf(row) * minorPerEuro * per * dearer * (0.92 + random.next() * 0.2);
  const breaks = steps.slice(0, random.whole(2, 4)).map((quantity, step) => ({
    quantity,
    unitPrice: roundPrice(one * (STEP_FACTORS[step] ?? 1)),
  }));
  const least = Math.max(steps[0] ?? 1, Math.ceil(leastPieces / pack) * pack);
  return {
    supplier: name,
    supplierPartNumber: `${mark}${20_011 + index * 13}`,
    currency,
    per,
    pack,
    breaks: breaks.filter(({ unitPrice }, at) => at === 0 || unitPrice < (breaks[at - 1]?.unitPrice ?? 0)),
    leastQuantity: row.kind === 'gear' ? least : (steps[0] ?? 1),
    leadTimeDays: random.chance(0.3) ? null : leadTime(name, random),
    source: random.pick(sources),
  };
}

/** Most prices are of the last months, some are too old to order by, a few offers have run out. */
function usualDays(random: Random, today: string): ReturnType<typeof daysOf> {
  const kind = random.next();
  if (kind < 0.1) return daysOf(today, random.whole(185, 330), null);
  if (kind < 0.16) return daysOf(today, random.whole(200, 340), -random.whole(5, 90));
  const ago = random.whole(4, 170);
  return daysOf(today, ago, random.chance(0.4) ? null : random.whole(20, 365 - ago));
}

/** Now and then last year's offer is still on record, or next year's is there already. */
function otherYears(
  row: LibraryRow,
  index: number,
  name: SupplierName,
  random: Random,
  today: string,
): OfferRow[] {
  const before = random.chance(0.12)
    ? [{ ...offer(row, index, name, random, 0.95), ...daysOf(today, 540, -random.whole(175, 190)) }]
    : [];
  const next = random.chance(0.03)
    ? [{ ...offer(row, index, name, random, 1.04), ...daysOf(today, 6, 400), validFrom: addDays(today, 25) }]
    : [];
  return [...before, ...next];
}

/** Priced and valid from so many days ago; the last day so many days from now, null: until further notice. */
function daysOf(
  today: string,
  ago: number,
  until: number | null,
): { pricedOn: string; validFrom: string; validUntil: string | null } {
  const pricedOn = addDays(today, -ago);
  return { pricedOn, validFrom: pricedOn, validUntil: until === null ? null : addDays(today, until) };
}

function leadTime(name: SupplierName, random: Random): number {
  switch (name) {
    case SUPPLIER.corrie:
      return random.whole(1, 4);
    case SUPPLIER.tidewrack:
      return random.whole(3, 10);
    case SUPPLIER.asanagi:
    case SUPPLIER.lazuli:
      return random.whole(21, 49);
    default:
      return random.whole(7, 28);
  }
}

/** Prices as suppliers print them: three figures that count, never below one minor unit. */
function roundPrice(minor: number): number {
  return Math.max(1, Math.round(Number(minor.toPrecision(3))));
}

function seller(
  currency: string,
  minorPerEuro: number,
  mark: string,
  leastPieces: number,
  sources: readonly string[],
): Seller {
  return { currency, minorPerEuro, mark, leastPieces, sources };
}

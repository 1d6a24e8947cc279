import { type BulkRow } from '@stageyard/backend/bulk-loading/bulk-row';
import { type Random } from '../data/random.js';
import { type ScalePart } from './scale-part.js';
import { type ScaleSupplier } from './scale-suppliers.js';

type Offers = NonNullable<BulkRow['offers']>;

const DAY_MS = 86_400_000;
/** Days counted from one day, each written once: a large set names the same few hundred again and again. */
let written = new Map<number, string>();
let writtenFrom = '';

function dayFrom(today: string, days: number): string {
  if (today !== writtenFrom) written = new Map();
  writtenFrom = today;
  const known = written.get(days);
  if (known !== undefined) return known;
  const day = new Date(Date.parse(today) + days * DAY_MS).toISOString().slice(0, 10);
  written.set(days, day);
  return day;
}

/** Small things are priced by the hundred. */
const BY_THE_HUNDRED = new Set(['fastener', 'key', 'retaining-ring']);
const STEPS = [1, 10, 50, 200];

/**
 * One to three offers for a part, each of another supplier; one in twenty has run out.
 * @param mark stands in the suppliers' own numbers
 * @param today ISO 8601 date from which the days are counted
 */
export function scaleOffers(
  random: Random,
  part: ScalePart,
  mark: string,
  { suppliers, today }: { suppliers: readonly ScaleSupplier[]; today: string },
): Offers {
  const count = Math.min(random.whole(1, 3), suppliers.length);
  const first = random.whole(0, suppliers.length - 1);
  const per = BY_THE_HUNDRED.has(part.kind) ? 100 : 1;
  const base = Math.round((part.mass * 900 + random.whole(150, 1200)) * (per === 1 ? 1 : 10));
  return Array.from({ length: count }, (_, index) => {
    const supplier = suppliers[(first + index) % suppliers.length] as ScaleSupplier;
    const dear = 0.9 + random.next() * 0.3;
    const pricedOn = -random.whole(1, 300);
    const openEnd = random.chance(0.4);
    return {
      supplierCode: supplier.code,
      supplierPartNumber: `${supplier.name.slice(0, 2).toUpperCase()}-${mark}`,
      currency: supplier.currency,
      per,
      breaks: STEPS.slice(0, random.whole(1, STEPS.length)).map((step, nth) => ({
        quantity: step * (per === 1 ? 1 : 100),
        unitPrice: Math.max(1, Math.round(base * dear * (1 - nth * 0.08))),
      })),
      pack: per === 1 ? random.pick([1, 1, 1, 5]) : 100,
      leadTimeDays: random.chance(0.8) ? random.whole(2, 60) : null,
      validFrom: dayFrom(today, pricedOn),
      validUntil: openEnd ? null : dayFrom(today, random.chance(0.9) ? random.whole(10, 365) : -1),
      pricedOn: dayFrom(today, pricedOn),
      source: `Price list ${dayFrom(today, pricedOn).slice(0, 7)}`,
    };
  });
}

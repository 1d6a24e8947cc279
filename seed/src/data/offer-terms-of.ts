import { type LibraryRow } from './library.js';
import { SUPPLIER, type SupplierName } from './supplier-names.js';
import { worthOf } from './worth.js';

/** How parts of a kind are sold. Quantities in the part's unit. */
export interface SalesForm {
  per: 1 | 10 | 100;
  pack: number;
  /** Where prices fall; the first is where they begin. */
  steps: readonly number[];
}

/** What is off the price of one at each step. */
export const STEP_FACTORS = [1, 0.93, 0.86, 0.8] as const;

/** Who sells a part, the usual source first; nobody for parts that the workshop makes. */
export function sellersOf(row: LibraryRow): SupplierName[] {
  if (row.supply === 'made') return [];
  const { marrow, tidewrack, larkspit, corrie, asanagi, lazuli } = SUPPLIER;
  if (row.kind !== 'gear') {
    const usual = row.supplier === corrie ? corrie : tidewrack;
    return [usual, usual === corrie ? tidewrack : corrie];
  }
  const first = row.supplier as SupplierName;
  const { module } = row.attributes;
  const cutsFine = module <= 1.5 && row.material !== 'C45' ? [asanagi] : [];
  const castsCoarse = module >= 2.5 ? [lazuli] : [];
  const others = row.supplier === larkspit ? [tidewrack] : [tidewrack, marrow, ...cutsFine, ...castsCoarse];
  return [first, ...others.filter((name) => name !== first)];
}

/** Packs and price steps of a kind of part. */
export function salesFormOf(row: LibraryRow): SalesForm {
  switch (row.kind) {
    case 'fastener':
      return { per: 100, pack: 100, steps: [100, 500, 1000, 5000] };
    case 'retaining-ring':
      return { per: 100, pack: 50, steps: [50, 200, 1000] };
    case 'key':
      return { per: 10, pack: 10, steps: [10, 50, 200] };
    case 'bearing':
      return { per: 1, pack: 1, steps: [1, 10, 50, 100] };
    case 'seal':
      return { per: 1, pack: 5, steps: [5, 25, 100] };
    case 'lubricant':
      return canForm(Number(row.attributes.packVolume));
    case 'other':
      return otherForm(worthOf(row));
    case 'gear':
      return gearForm(worthOf(row));
    case 'shaft':
    case 'housing':
      return { per: 1, pack: 1, steps: [1, 5] };
  }
}

function canForm(can: number): SalesForm {
  return { per: 1, pack: can, steps: [can, can * 4, can * 12] };
}

function otherForm(worth: number): SalesForm {
  if (worth < 0.15) return { per: 100, pack: 100, steps: [100, 500, 2000] };
  return worth < 1 ? { per: 10, pack: 10, steps: [10, 50, 200] } : { per: 1, pack: 1, steps: [1, 10, 50] };
}

function gearForm(worth: number): SalesForm {
  if (worth < 5) return { per: 1, pack: 5, steps: [5, 25, 100, 500] };
  return worth < 40 ? { per: 1, pack: 1, steps: [1, 5, 20, 100] } : { per: 1, pack: 1, steps: [1, 3, 10] };
}

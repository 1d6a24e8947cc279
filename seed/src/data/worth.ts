import { type GearRow } from './gears.js';
import { type LibraryRow } from './library.js';
import { type OtherRow } from './other-parts.js';

/** What gears of a material cost to make, EUR: for each gear, each tooth and each kilogram. */
const GEAR_COST: Record<string, { each: number; tooth: number; kilogram: number }> = {
  C45: { each: 4.2, tooth: 0.08, kilogram: 4 },
  '42CrMo4': { each: 5.8, tooth: 0.12, kilogram: 5.5 },
  '16MnCr5': { each: 8.5, tooth: 0.16, kilogram: 7 },
  'X17CrNi16-2': { each: 9, tooth: 0.17, kilogram: 11 },
  'EN-GJL-250': { each: 7, tooth: 0.1, kilogram: 3 },
  CuZn39Pb3: { each: 2.4, tooth: 0.05, kilogram: 12 },
  POM: { each: 0.8, tooth: 0.03, kilogram: 14 },
  'PA 6 G': { each: 1.6, tooth: 0.05, kilogram: 12 },
};

/** EUR for one piece or one litre, before a supplier sets a price on it: our own rough figures, made for the demo. */
export function worthOf(row: LibraryRow): number {
  return row.kind === 'gear' ? gearWorth(row) : otherWorth(row);
}

function gearWorth({ material, mass, attributes }: GearRow): number {
  const cost = GEAR_COST[material];
  if (cost === undefined) throw new Error(`There is no price for gears of ${material}.`);
  return cost.each + cost.tooth * attributes.teeth + cost.kilogram * mass;
}

function otherWorth({ kind, mass, material, description, attributes }: OtherRow): number {
  const size = (name: string): number => Number(attributes[name] ?? 0);
  switch (kind) {
    case 'bearing': {
      const open = 1.6 + size('outerDiameter') ** 2 * 0.0042;
      return attributes.type === 'deep-groove ball, sealed' ? open * 1.18 : open;
    }
    case 'key':
      return 0.1 + size('width') * size('height') * size('length') * 0.00014;
    case 'retaining-ring':
      return 0.04 + size('shaftDiameter') * 0.006;
    case 'seal':
      return 1.1 + size('outerDiameter') * 0.055;
    case 'lubricant':
      return (
        6.2 +
        Number(/\d+$/.exec(String(attributes.viscosityGrade))?.[0] ?? 0) * 0.006 +
        2 / size('packVolume')
      );
    case 'fastener':
      return 0.02 + mass * 6;
    case 'other':
      return material === 'steel' && !description.includes('plug') ? 0.03 + mass * 14 : 1.6 + mass * 60;
    case 'shaft':
    case 'housing':
      return 12 + mass * 9;
  }
}

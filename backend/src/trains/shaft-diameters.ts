import { bearingBoreFor, parallelKeyForBore } from '@stageyard/libs/bill-of-materials';
import { gearGeometry } from '@stageyard/libs/gear-geometry';
import { type AdoptedShaft, type AdoptedSpec, gearsOnShaft, type PlacedGear } from './adopted-spec.js';

/** A shaft starts with this when neither a torque nor a stock gear's bore says more, mm. */
export const STARTING_DIAMETER = 10;
/** Thinnest and thickest shaft that can be typed, mm. */
export const SHAFT_BOUNDS = { least: 2, greatest: 500 } as const;

/** What sizes one shaft; null where nothing is known. */
export interface ShaftDemand {
  /** Least diameter for torsion, whole mm. */
  leastDiameter: number | null;
  /** Bores of the stock gears that sit on it, mm. */
  bores: number[];
}

/**
 * A diameter for every shaft: the smallest bore of the stock gears on it where the torque allows that; else the
 * torque's least diameter raised to the next bearing bore (ISO 15), so that bearings, rings and seals can be bought;
 * else the starting figure. Where the roots of the gears leave less room, what fits in whole mm.
 * @param demands one a shaft, in order
 */
export function chooseShaftDiameters(
  spec: Pick<AdoptedSpec, 'stages' | 'pressureAngleDeg' | 'helixAngleDeg'>,
  demands: readonly ShaftDemand[],
): AdoptedShaft[] {
  return demands.map((demand, shaft) => {
    const gears = gearsOnShaft(spec, shaft);
    const wish = wishedDiameter(demand);
    const within = Math.min(...gears.map((placed) => rootLimit(spec, placed)));
    if (wish.basis !== 'start') return { ...wish, diameter: Math.min(wish.diameter, within) };
    // The starting figure is only an opinion: it gives way to a keyed hub.
    const keyed = Math.min(...gears.map((placed) => keyedLimit(spec, placed)));
    const diameter =
      keyed >= SHAFT_BOUNDS.least ? Math.min(wish.diameter, keyed) : Math.min(wish.diameter, within);
    return { ...wish, diameter };
  });
}

function wishedDiameter({ leastDiameter, bores }: ShaftDemand): AdoptedShaft {
  const bore = bores.length > 0 ? Math.min(...bores) : null;
  if (bore !== null && (leastDiameter === null || bore >= leastDiameter))
    return { diameter: bore, basis: 'bore' };
  if (leastDiameter !== null) {
    return { diameter: bearingBoreFor(leastDiameter) ?? leastDiameter, basis: 'torque' };
  }
  return { diameter: STARTING_DIAMETER, basis: 'start' };
}

/** The largest whole mm inside the root circle: a pinion cut on its shaft. */
export function rootLimit(angles: GearAngles, placed: PlacedGear): number {
  return Math.floor(rootDiameter(angles, placed));
}

/** The largest whole-mm bore that leaves two modules of rim under the keyway; 0 when none does. */
function keyedLimit(angles: GearAngles, placed: PlacedGear): number {
  const root = rootDiameter(angles, placed);
  for (let bore = Math.floor(root); bore > 0; bore -= 1) {
    const key = parallelKeyForBore(bore);
    if (key && (root - bore) / 2 - key.hubDepth >= 2 * placed.module) return bore;
  }
  return 0;
}

type GearAngles = Pick<AdoptedSpec, 'pressureAngleDeg' | 'helixAngleDeg'>;

function rootDiameter({ pressureAngleDeg, helixAngleDeg }: GearAngles, { gear, module }: PlacedGear): number {
  const { teeth, profileShift } = gear;
  return gearGeometry({ teeth, module, profileShift, pressureAngleDeg, helixAngleDeg }).rootDiameter;
}

import { parallelKeyForBore } from '@stageyard/libs/bill-of-materials';
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
 * A diameter for every shaft, in whole mm unless a stock bore says otherwise: the torque's least diameter, raised to
 * the smallest bore of the stock gears on the shaft where that is larger; without a torque that bore; else the
 * starting figure. Never more than fits inside the roots of the gears on the shaft.
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
  if (leastDiameter !== null && (bore === null || leastDiameter >= bore)) {
    return { diameter: leastDiameter, basis: 'torque' };
  }
  if (bore !== null) return { diameter: bore, basis: 'bore' };
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

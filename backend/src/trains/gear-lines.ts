import { type AdoptedSpec, gearsOf, type PlacedGear } from './adopted-spec.js';
import { type GearNeed } from './stock-gears.service.js';

/** Gears of a train with the very same data: one part serves them all. */
export interface GearLine {
  need: GearNeed;
  places: PlacedGear[];
}

/**
 * The gears of a train, equal ones together, in the order in which they first come.
 * @param builds trains built at once; every need is for so many
 */
export function gearLinesOf(
  spec: Pick<AdoptedSpec, 'stages' | 'pressureAngleDeg' | 'helixAngleDeg'>,
  builds: number,
): GearLine[] {
  const lines = new Map<string, PlacedGear[]>();
  for (const placed of gearsOf(spec)) {
    const { teeth, profileShift, faceWidth, hand } = placed.gear;
    const key = JSON.stringify([placed.module, teeth, profileShift, faceWidth, hand]);
    lines.set(key, [...(lines.get(key) ?? []), placed]);
  }
  return [...lines.values()].flatMap((places): GearLine[] => {
    const [first] = places;
    if (!first) return [];
    const { gear, module } = first;
    const { pressureAngleDeg, helixAngleDeg } = spec;
    const { teeth, profileShift, faceWidth } = gear;
    const hand = helixAngleDeg > 0 ? (gear.hand ?? null) : null;
    const wanted = places.length * builds;
    return [
      {
        need: { module, teeth, pressureAngleDeg, helixAngleDeg, hand, profileShift, faceWidth, wanted },
        places,
      },
    ];
  });
}

import { type KitGear, type KitRequest, type PartFinder, type PartNeed, type PartRef } from '../index.js';

/** A gear with everything a test does not care about filled in. */
export function newKitGear(over: Partial<KitGear> & Pick<KitGear, 'stage' | 'role' | 'teeth'>): KitGear {
  return {
    module: 1.5,
    pressureAngleDeg: 20,
    helixAngleDeg: 0,
    profileShift: 0,
    faceWidth: 15,
    material: 'steel C45',
    ...over,
  };
}

/** 20/60 at m 1.5, then 20/50 at m 2, on shafts of 12, 15 and 20 mm: every gear is thick enough for a keyway. */
export function twoStageKit(over: Partial<KitRequest> = {}): KitRequest {
  return {
    trainTitle: 'Kelp-line winch',
    centreDistances: [60, 70],
    gears: [
      newKitGear({ stage: 1, role: 'pinion', teeth: 20 }),
      newKitGear({ stage: 1, role: 'wheel', teeth: 60 }),
      newKitGear({ stage: 2, role: 'pinion', teeth: 20, module: 2, faceWidth: 20 }),
      newKitGear({ stage: 2, role: 'wheel', teeth: 50, module: 2, faceWidth: 20 }),
    ],
    shafts: [
      { index: 0, diameter: 12, length: 60, material: 'steel C45' },
      { index: 1, diameter: 15, length: 60, material: 'steel C45' },
      { index: 2, diameter: 20, length: 60, material: 'steel C45' },
    ],
    box: { length: 200, width: 80, height: 120, wall: 6 },
    ...over,
  };
}

/** A library that holds nothing. */
export const emptyLibrary: PartFinder = { find: () => null };

/** A library that answers some kinds of need. */
export function libraryOf(answers: {
  [Kind in PartNeed['kind']]?: (need: Extract<PartNeed, { kind: Kind }>) => PartRef | null;
}): PartFinder {
  return {
    find(need: PartNeed) {
      // The table pairs each kind with its own need, which TypeScript cannot follow through the lookup.
      const answer = answers[need.kind] as ((asked: PartNeed) => PartRef | null) | undefined;
      return answer?.(need) ?? null;
    },
  };
}

export function newPartRef(over: Partial<PartRef> & Pick<PartRef, 'number' | 'kind'>): PartRef {
  return {
    description: `Stock ${over.kind}`,
    material: 'steel C45',
    supply: 'bought',
    supplier: 'Harrow Point Gears',
    mass: 0.25,
    standing: 'cleared',
    ...over,
  };
}

import { keyLengthForHub, parallelKeyForBore } from './parallel-key.js';
import { type KitGear, type KitRequest, type KitShaft } from './kit.js';
import {
  type GearNeed,
  type PartFinder,
  type PartGear,
  type PartRef,
  type PinionShaftNeed,
} from './part-finder.js';

/** A gear on its shaft, with the library part that stands for it, if any. Lengths mm. */
export interface MountedGear {
  gear: KitGear;
  shaft: KitShaft;
  part: PartRef | null;
  /** What the library was asked for. */
  need: GearNeed | PinionShaftNeed;
  /** null when the pinion is cut on its shaft. */
  bore: number | null;
  /** Length of hub that a key can use. */
  hubLength: number;
  source: string;
}

/** Places every gear on its shaft and asks the library for it. Gears come in stage order, pinion first. */
export function mountGears(request: KitRequest, library: PartFinder): MountedGear[] {
  const order = (gear: KitGear) => gear.stage * 2 + (gear.role === 'wheel' ? 1 : 0);
  const gears = [...request.gears].sort((a, b) => order(a) - order(b));
  return gears.map((gear) => mountGear(gear, shaftOf(gear, request), library));
}

function mountGear(gear: KitGear, shaft: KitShaft, library: PartFinder): MountedGear {
  const source = `Stage ${gear.stage} ${gear.role}`;
  if (isCutOnShaft(gear, shaft)) {
    const own = { shaftDiameter: shaft.diameter, shaftLength: shaft.length };
    const need = { kind: 'pinion-shaft' as const, ...toothNeed(gear), ...own };
    const part = library.find(need);
    return { gear, shaft, part, need, bore: null, hubLength: gear.faceWidth, source };
  }
  const need = { kind: 'gear' as const, ...toothNeed(gear), bore: shaft.diameter };
  const part = library.find(need);
  if (part?.kind === 'pinion-shaft') {
    return { gear, shaft, part, need, bore: null, hubLength: gear.faceWidth, source };
  }
  // A smaller stock bore is bored out to the shaft; a larger one stays as it is and is flagged.
  const bore = Math.max(part?.gear?.bore ?? 0, shaft.diameter);
  return { gear, shaft, part, need, bore, hubLength: part?.gear?.hubLength ?? gear.faceWidth, source };
}

/**
 * Rim between the bottom of the keyway and the root circle, mm: (d_f − bore)/2 − t2. Bores without a standard key
 * count no keyway.
 */
export function rimUnderKeyway(gear: KitGear, bore: number): number {
  return (rootDiameter(gear) - bore) / 2 - (parallelKeyForBore(bore)?.hubDepth ?? 0);
}

/** Least rim that a keyed gear needs: two modules. */
export function leastRim(gear: KitGear): number {
  return 2 * gear.module;
}

/** The key length for this gear, or null when the bore has no standard key. */
export function keyFor(mounted: MountedGear & { bore: number }) {
  const key = parallelKeyForBore(mounted.bore);
  return key && { ...key, ...keyLengthForHub(key, mounted.hubLength) };
}

/** kg; a disc of the reference diameter with its bore. A gear cut on its shaft counts what stands above the shaft. */
export function gearMass(gear: KitGear, boreOrShaft: number): number {
  const area = (Math.PI / 4) * (referenceDiameter(gear) ** 2 - boreOrShaft ** 2);
  return Math.max(0, area) * gear.faceWidth * (gear.density ?? 7850) * 1e-9;
}

/** kg; a plain cylinder. */
export function shaftMass(shaft: KitShaft): number {
  return (Math.PI / 4) * shaft.diameter ** 2 * shaft.length * (shaft.density ?? 7850) * 1e-9;
}

/** What the library knows of the part's teeth, or null. */
export function partGear(mounted: MountedGear): PartGear | null {
  return mounted.part?.gear ?? null;
}

function isCutOnShaft(gear: KitGear, shaft: KitShaft): boolean {
  if (gear.mounting) return gear.mounting === 'integral';
  if (gear.role === 'wheel' || gear.partNumber) return false;
  return rimUnderKeyway(gear, shaft.diameter) < leastRim(gear);
}

function toothNeed(gear: KitGear) {
  return {
    partNumber: gear.partNumber ?? null,
    teeth: gear.teeth,
    module: gear.module,
    pressureAngleDeg: gear.pressureAngleDeg,
    helixAngleDeg: gear.helixAngleDeg,
    hand: gear.helixAngleDeg === 0 ? null : (gear.hand ?? null),
    profileShift: gear.profileShift,
    faceWidth: gear.faceWidth,
  };
}

function shaftOf(gear: KitGear, request: KitRequest): KitShaft {
  const index = gear.role === 'pinion' ? gear.stage - 1 : gear.stage;
  const shaft = request.shafts.find((candidate) => candidate.index === index);
  if (!shaft) throw new Error(`shaft ${index} was checked to be there`);
  return shaft;
}

function referenceDiameter(gear: KitGear): number {
  const cosBeta = Math.cos((gear.helixAngleDeg * Math.PI) / 180);
  return gear.figures?.referenceDiameter ?? (gear.module * gear.teeth) / cosBeta;
}

/** d_f, mm: as computed, or from the rack when the figures are not given. */
export function rootDiameter(gear: KitGear): number {
  const dedendum = gear.rack?.dedendum ?? 1.25;
  return (
    gear.figures?.rootDiameter ?? referenceDiameter(gear) - 2 * gear.module * (dedendum - gear.profileShift)
  );
}

import { checkKit } from './check-kit.js';
import { gearDataRows, type GearDataRow } from './gear-data.js';
import { type KitRequest } from './kit.js';
import { mountGears, type MountedGear } from './mounted-gear.js';
import { type PartFinder } from './part-finder.js';

/** The gear data of one gear of a train. */
export interface TrainGearData {
  stage: number;
  role: 'pinion' | 'wheel';
  partNumber: string | null;
  rows: GearDataRow[];
}

/**
 * Gear data of every gear, stock gears too, in stage order, for the sheet that goes to the gear maker. All as designed:
 * a stock gear's own shift is not put in its place.
 * @throws InputError as `buildBom`
 */
export function trainGearData(request: KitRequest, library: PartFinder): TrainGearData[] {
  checkKit(request);
  const mounted = mountGears(request, library);
  return mounted.map((own) => ({
    stage: own.gear.stage,
    role: own.gear.role,
    partNumber: numberOf(own),
    rows: dataOf(own, mateOf(own, mounted), request),
  }));
}

export function dataOf(own: MountedGear, mate: MountedGear | undefined, request: KitRequest): GearDataRow[] {
  return gearDataRows({
    ...own.gear,
    material: own.part?.material ?? own.gear.material ?? null,
    heatTreatment: own.part?.gear?.heatTreatment ?? own.gear.heatTreatment ?? null,
    bore: own.bore,
    mate: {
      teeth: mate?.gear.teeth ?? null,
      partNumber: mate ? (numberOf(mate) ?? 'to be made') : null,
      centreDistance: request.centreDistances?.[own.gear.stage - 1] ?? null,
    },
  });
}

function numberOf(mounted: MountedGear): string | null {
  return mounted.part?.number ?? mounted.gear.partNumber ?? null;
}

export function mateOf(own: MountedGear, mounted: readonly MountedGear[]): MountedGear | undefined {
  return mounted.find((other) => other.gear.stage === own.gear.stage && other !== own);
}

import { type GearInput, type MeshInput } from '../index.js';

/** The same gear at another module: every length follows, every coefficient stays. */
export function scaledGear(gear: GearInput, by: number): GearInput {
  const { faceWidth, thicknessAllowance: allowance } = gear;
  return {
    ...gear,
    module: gear.module * by,
    ...(faceWidth === undefined ? {} : { faceWidth: faceWidth * by }),
    ...(allowance === undefined
      ? {}
      : { thicknessAllowance: { upper: allowance.upper * by, lower: allowance.lower * by } }),
  };
}

/** The same pair at another module. */
export function scaledMesh(mesh: MeshInput, by: number): MeshInput {
  return {
    ...mesh,
    pinion: scaledGear(mesh.pinion, by),
    wheel: scaledGear(mesh.wheel, by),
    ...(mesh.centreDistance === undefined ? {} : { centreDistance: mesh.centreDistance * by }),
  };
}

/** Modules that a check value is repeated at: as printed, inch-sized, tiny, large. */
export const SCALES = [1, 25.4 / 6, 0.1, 5] as const;

/**
 * Angular backlash at the output with the input held, arcmin: every mesh's backlash at its wheel, divided by the
 * ratios of the stages after it.
 */
export function outputBacklash(meshes: readonly { ratio: number; angularBacklashArcmin: number }[]): number {
  return meshes.reduce((sum, mesh) => sum / mesh.ratio + mesh.angularBacklashArcmin, 0);
}

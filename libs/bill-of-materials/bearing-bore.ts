// Bores of radial bearings, ISO 15, mm (from memory); above 20 mm the steps of five that every maker holds.
const BORES: readonly number[] = [
  3, 4, 5, 6, 7, 8, 9, 10, 12, 15, 17, 20, 25, 30, 35, 40, 45, 50, 55, 60, 65, 70, 75, 80, 85, 90, 95, 100,
  105, 110, 120, 130, 140, 150, 160, 170, 180, 190, 200,
];

/** The smallest common bearing bore of at least this shaft diameter, mm; null above 200. */
export function bearingBoreFor(diameterMm: number): number | null {
  return BORES.find((bore) => bore >= diameterMm) ?? null;
}

/** Whether a diameter is a bearing bore of the list. */
export function isBearingBore(diameterMm: number): boolean {
  return BORES.includes(diameterMm);
}

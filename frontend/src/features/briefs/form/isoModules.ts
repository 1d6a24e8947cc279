/**
 * Normal modules of ISO 54 within the span small drives use, mm. Series I is to be preferred; series II is the
 * second choice; 6.5 is to be avoided and left out. (Below 1 mm: the fine-pitch row used alongside it.)
 */
export const SERIES_ONE = [0.5, 0.6, 0.8, 1, 1.25, 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10] as const;
export const SERIES_TWO = [0.7, 0.9, 1.125, 1.375, 1.75, 2.25, 2.75, 3.5, 4.5, 5.5, 7, 9] as const;

/** Which series a module belongs to; 'none' means cutters are likely to be special. */
export function seriesOf(module: number): 'I' | 'II' | 'none' {
  if (SERIES_ONE.some((listed) => listed === module)) return 'I';
  if (SERIES_TWO.some((listed) => listed === module)) return 'II';
  return 'none';
}

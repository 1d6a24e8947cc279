/** Why a shelf quantity changed. A count sets what is there; a correction mends an earlier movement. */
export const MOVEMENT_KINDS = ['received', 'issued', 'counted', 'corrected'] as const;
export type MovementKind = (typeof MOVEMENT_KINDS)[number];

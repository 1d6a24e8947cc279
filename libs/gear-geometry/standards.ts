import { type Rack } from './types.js';

/** Basic racks of ISO 53, in modules. */
export const BASIC_RACKS: Readonly<Record<'A' | 'B' | 'C' | 'D', Rack>> = {
  A: { addendum: 1, dedendum: 1.25, tipRadius: 0.38 },
  B: { addendum: 1, dedendum: 1.25, tipRadius: 0.3 },
  C: { addendum: 1, dedendum: 1.25, tipRadius: 0.25 },
  D: { addendum: 1, dedendum: 1.4, tipRadius: 0.39 },
};

/** Normal modules of ISO 54 in mm; series I is preferred, 6.5 of series II is to be avoided. */
export const STANDARD_MODULES: Readonly<Record<'I' | 'II', readonly number[]>> = {
  I: [1, 1.25, 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10, 12, 16, 20, 25, 32, 40, 50],
  II: [1.125, 1.375, 1.75, 2.25, 2.75, 3.5, 4.5, 5.5, 6.5, 7, 9, 11, 14, 18, 22, 28, 36, 45],
};

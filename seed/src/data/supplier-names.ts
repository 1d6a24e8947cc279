/** The invented firms that the demo workshop buys from. */
export const SUPPLIER = {
  marrow: 'Marrow Sound Gear Works',
  tidewrack: 'Tidewrack Transmission Supply',
  larkspit: 'Larkspit Plastics & Brass',
  corrie: 'Corrie Lane Bearings',
  asanagi: 'Asanagi Fine Gears',
  lazuli: 'Engrenages du Cap Lazuli',
} as const;

export type SupplierName = (typeof SUPPLIER)[keyof typeof SUPPLIER];

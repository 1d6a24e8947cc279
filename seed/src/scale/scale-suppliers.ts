/** The firms that offer the parts of a scale set; invented. */
export const SCALE_SUPPLIERS = [
  { name: 'Gannet Rock Gearing', currency: 'EUR', language: 'en', leadTimeDays: 14 },
  { name: 'Skerry Point Drive Parts', currency: 'GBP', language: 'en', leadTimeDays: 21 },
  { name: 'Tangwick Metal Cutting', currency: 'EUR', language: 'de', leadTimeDays: 30 },
  { name: 'Harrow Holm Trading', currency: 'USD', language: 'en', leadTimeDays: 45 },
] as const;

/** A supplier that the rows may name. */
export interface ScaleSupplier {
  code: string;
  name: string;
  currency: string;
}

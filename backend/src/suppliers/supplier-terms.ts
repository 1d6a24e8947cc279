/** Whether a supplier is asked and ordered from. */
export const SUPPLIER_STANDINGS = ['active', 'closed'] as const;
export type SupplierStanding = (typeof SUPPLIER_STANDINGS)[number];

/** Languages that enquiries can be written in, as BCP 47 tags. */
export const SUPPLIER_LANGUAGES = [
  'en',
  'de',
  'fr',
  'it',
  'es',
  'pt',
  'nl',
  'da',
  'sv',
  'nb',
  'fi',
  'pl',
  'cs',
  'ja',
  'zh',
  'ko',
  'ar',
  'tr',
] as const;
export type SupplierLanguage = (typeof SUPPLIER_LANGUAGES)[number];

/** Most people to send an enquiry to at one supplier. */
export const MOST_CONTACTS = 20;

/** Greatest amount of money in one field, minor units: far above any order, far below what a number holds exactly. */
export const GREATEST_AMOUNT = 1_000_000_000_000;

/** Longest time until parts arrive, calendar days. */
export const LONGEST_LEAD_TIME = 3650;

/** How a supplier charges freight for one order. */
export const FREIGHT_KINDS = ['included', 'flat', 'free-from', 'as-charged'] as const;
export type FreightKind = (typeof FREIGHT_KINDS)[number];

/** Freight of one order, in minor units of the supplier's currency. */
export interface FreightRule {
  /** `flat`: always `charge`; `free-from`: `charge`, and nothing from an order value of `freeFrom`; `as-charged`: not known before. */
  kind: FreightKind;
  charge: number | null;
  freeFrom: number | null;
}

/** Somebody to send an enquiry to. */
export interface SupplierContact {
  name: string;
  role: string;
  email: string;
  phone: string;
}

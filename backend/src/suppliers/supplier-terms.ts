/** Whether a supplier is asked and ordered from. */
export const SUPPLIER_STANDINGS = ['active', 'closed'] as const;
export type SupplierStanding = (typeof SUPPLIER_STANDINGS)[number];

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

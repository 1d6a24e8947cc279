/** The team's own limits, in one place. Everything that judges a gear, a mesh or a train reads them here. */
export const HOUSE_RULES = {
  /** Least transverse contact ratio. */
  leastContactRatio: 1.2,
  /** Least tip thickness, normal, in modules. */
  leastTipThickness: 0.2,
  /** The same for case-hardened gears, whose tips would harden through. */
  leastTipThicknessHardened: 0.4,
  /** Least clearance between a tip and the mate's root, in modules. */
  leastTipClearance: 0.12,
  /** A figure within this many per cent of its limit counts as marginal. */
  marginalPercent: 5,
  /** Allowed torsional stress of a shaft, MPa. */
  shaftStress: 25,
  /** Gap between the planes of neighbouring stages, mm. */
  planeGap: 5,
  /** Least gap between rotating parts that share a plane, mm. */
  leastPartGap: 2,
  /** Coefficient of friction in a mesh, for losses. */
  meshFriction: 0.06,
  /** Density of steel where a material states none, kg/m³. */
  steelDensity: 7850,
  /** Application factor where the brief states none. */
  applicationFactor: 1.25,
  /** An option search asked for by the calc endpoint stops after this many milliseconds. */
  searchTimeLimitMs: 20_000,
  /** An option search of a brief stops after this many milliseconds. */
  briefSearchTimeLimitMs: 120_000,
  /** A price that a supplier stated longer ago than this is marked as too old, days. */
  priceAgeDays: 180,
  /** Prices in this currency come first, since there are no exchange rates. ISO 4217. */
  currency: 'EUR',
} as const;

export type HouseRuleFigures = typeof HOUSE_RULES;

import type { Bom, BomLine, LinePrice, TrainPriceLine, TrainPrices } from '../api/types';

/** A bought line for tests; give what matters to the test. */
export function newBomLine(given: Partial<BomLine> = {}): BomLine {
  return {
    key: 'BR-00401',
    findNumber: 401,
    partNumber: 'BR-00401',
    kind: 'bearing',
    description: 'Deep-groove ball bearing 8 × 22 × 7 mm',
    quantity: 2,
    unit: 'pcs',
    material: null,
    supply: 'bought',
    supplier: null,
    mass: 0.012,
    source: ['Shaft 0'],
    note: '',
    flags: [],
    replaces: null,
    extraLineId: null,
    ...given,
  };
}

export function newBom(lines: BomLine[], given: Partial<Bom> = {}): Bom {
  const totals = { lines: lines.length, made: 0, bought: lines.length, massKg: 0.1, linesWithoutMass: 0 };
  return { lines, totals, flags: [], extraLines: [], idleSwaps: [], ...given };
}

/** A price chosen by the rule, on the day it was stated. */
export function newLinePrice(given: Partial<LinePrice> = {}): LinePrice {
  return {
    offerId: '7',
    supplier: { code: 'S-0001', name: 'Corrie Lane Bearings' },
    supplierPartNumber: 'CL 608',
    currency: 'EUR',
    per: 1,
    unitPrice: 357,
    orderQuantity: 50,
    lineTotal: 17850,
    surplus: 0,
    cheaperAt: null,
    leadTimeDays: 4,
    pricedOn: '2026-12-01',
    ageDays: 0,
    tooOld: false,
    validUntil: null,
    chosenBy: 'rule',
    ...given,
  };
}

export function newPriceLine(given: Partial<TrainPriceLine> = {}): TrainPriceLine {
  return {
    key: 'BR-00401',
    findNumber: 401,
    partNumber: 'BR-00401',
    needed: 50,
    unit: 'pcs',
    onShelf: null,
    price: newLinePrice(),
    reason: null,
    otherOffers: 1,
    ...given,
  };
}

export function newTrainPrices(lines: TrainPriceLine[], given: Partial<TrainPrices> = {}): TrainPrices {
  return {
    buildQuantity: 25,
    on: '2026-12-01',
    lines,
    totals: [{ currency: 'EUR', minor: 17850, lines: 1 }],
    unpriced: [],
    lostChoices: [],
    oldestPricedOn: '2026-12-01',
    tooOld: 0,
    longestLeadTimeDays: 4,
    shelf: { covered: 0, lines: 1 },
    ...given,
  };
}

import type { Part } from '../api/types';

/** A stored spur gear for tests; give what matters to the test. */
export function newPart(given: Partial<Part> = {}): Part {
  return {
    id: '17',
    number: 'KW-00017',
    kind: 'gear',
    description: 'Spur gear, steel, 28 teeth',
    standing: 'cleared',
    successorNumber: null,
    material: 'C45',
    mass: 0.18,
    supply: 'bought',
    supplier: null,
    note: '',
    shelf: null,
    leastStock: null,
    unit: 'pcs',
    attributes: {
      teeth: 28,
      module: 2,
      pressureAngleDeg: 20,
      helixAngleDeg: 0,
      hand: null,
      profileShift: 0,
      faceWidth: 20,
      bore: 12,
      hubDiameter: null,
      hubLength: null,
      thicknessAllowanceUpper: null,
      thicknessAllowanceLower: null,
      heatTreatment: null,
      hardness: null,
    },
    computed: null,
    version: 3,
    createdAt: '2026-11-01T08:00:00.000Z',
    updatedAt: '2026-11-02T08:00:00.000Z',
    updatedBy: 'Levi Marsh',
    ...given,
  };
}

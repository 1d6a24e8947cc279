import type { Train } from '../api/types';

/** An adopted one-stage train for tests; give what matters to the test. The spec is a fresh copy every time. */
export function newTrain(given: Partial<Train> = {}): Train {
  const gear = { profileShift: 0, faceWidth: 10, partNumber: null };
  return {
    code: 'T-0007',
    title: 'Winch',
    note: '',
    revision: 'A',
    state: 'working',
    owner: 'Dara Quill',
    brief: null,
    spec: {
      pressureAngleDeg: 20,
      helixAngleDeg: 0,
      leastContactRatio: 1.2,
      shafts: [
        { diameter: 10, basis: 'typed' },
        { diameter: 12, basis: 'typed' },
      ],
      stages: [
        {
          module: 1,
          centreDistance: 40,
          pinion: { teeth: 20, ...gear },
          wheel: { teeth: 60, ...gear },
        },
      ],
    },
    stageCount: 1,
    centreDistanceSum: 40,
    ratio: { numerator: '3', denominator: '1', value: 3, errorPercent: 0 },
    box: { length: 90, width: 30, height: 70 },
    mass: 0.8,
    fails: 0,
    marginals: 0,
    optionKey: '20/60m1',
    buildQuantity: 1,
    offerChoices: [],
    figures: { meshes: [], shafts: [], checks: [], findings: [] } as unknown as Train['figures'],
    version: 4,
    createdAt: '2026-11-01T08:00:00.000Z',
    updatedAt: '2026-11-02T08:00:00.000Z',
    ...given,
  };
}

import type { Brief, Requirement, Search } from '../api/types';

export const requirement: Requirement = {
  ratio: { target: '37.5', tolerancePercent: '1' },
  stages: { min: 1, max: 3 },
  teeth: { pinion: { min: 18, max: 40 }, wheel: { min: 18, max: 120 } },
  modules: [1],
  pressureAngleDeg: 20,
  helixAngleDeg: 0,
  faceWidthFactor: 10,
  shiftPolicy: 'none',
  leastContactRatio: 1.2,
  centreDistanceAllowance: 0,
  undercut: 'refuse',
  stageRatio: { min: '1' },
  arrangement: 'in-line',
  source: 'any',
  direction: 'any',
  objective: 'centre-distance',
  limit: 50,
  bestOf: 'each-count',
  duty: { applicationFactor: 1.25 },
};

/** A saved brief for tests; give what matters to the test. */
export function newBrief(given: Partial<Brief> = {}): Brief {
  return {
    id: '7',
    code: 'B-0007',
    title: 'Winch',
    note: '',
    requirement,
    standing: 'open',
    owner: 'Dara Quill',
    version: 3,
    createdAt: '2026-11-01T08:00:00.000Z',
    updatedAt: '2026-11-02T08:00:00.000Z',
    latestSearch: null,
    pins: [],
    trains: [],
    ...given,
  };
}

/** A running search for tests. */
export function newSearch(given: Partial<Search> = {}): Search {
  return {
    id: '11',
    briefId: '7',
    briefVersion: 3,
    state: 'running',
    startedAt: '2026-11-02T08:00:00.000Z',
    finishedAt: null,
    optionCount: null,
    complete: null,
    message: null,
    by: 'Dara Quill',
    request: requirement,
    progress: null,
    outcome: null,
    ...given,
  };
}

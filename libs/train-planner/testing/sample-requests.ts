import { type OptionRequest } from '../index.js';

/** The workshop's kelp-line winch: 37.5 : 1 within 1 %. */
export function winchRequest(change: Partial<OptionRequest> = {}): OptionRequest {
  return {
    ratio: { target: '37.5', tolerancePercent: '1' },
    stages: { min: 1, max: 3 },
    teeth: { pinion: { min: 12, max: 40 }, wheel: { min: 12, max: 150 } },
    modules: [1],
    objective: 'centre-distance',
    ...change,
  };
}

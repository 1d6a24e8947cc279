import { type BriefInputDto } from '../briefs/dto/brief-input.dto.js';
import { type RequirementDto } from '../briefs/dto/requirement.dto.js';

/** A requirement that two stages meet within a moment; name only what the test is about. */
export function newRequirement(changes: Partial<RequirementDto> = {}): RequirementDto {
  return {
    ratio: { target: '12', tolerancePercent: '1' },
    stages: { min: 1, max: 2 },
    teeth: { pinion: { min: 17, max: 24 }, wheel: { min: 20, max: 96 } },
    modules: [1],
    objective: 'centre-distance',
    limit: 5,
    ...changes,
  };
}

/** A space so large that its search is still under way when the test looks. */
export function slowRequirement(): RequirementDto {
  return newRequirement({
    ratio: { target: '6.931', tolerancePercent: '0.001' },
    stages: { min: 1, max: 3 },
    teeth: { pinion: { min: 6, max: 400 }, wheel: { min: 6, max: 1000 } },
    objective: 'ratio-error',
    leastContactRatio: 0.5,
    limit: 500,
  });
}

/** Wheels that are smaller than the ratio asks for: no train can be found, however many stages. */
export function impossibleRequirement(): RequirementDto {
  return newRequirement({
    ratio: { target: '500', tolerancePercent: '1' },
    stages: { min: 1, max: 2 },
    teeth: { pinion: { min: 17, max: 24 }, wheel: { min: 20, max: 60 } },
  });
}

export function newBrief(changes: Partial<BriefInputDto> = {}): BriefInputDto {
  return { title: 'Vent drive', note: '', requirement: newRequirement(), ...changes };
}

import { Injectable } from '@nestjs/common';
import { gearGeometry, type GearInput, meshGeometry, shiftForPolicy } from '@stageyard/libs/gear-geometry';
import { type SearchOutcome, validateOptionRequest } from '@stageyard/libs/train-planner';
import { type Approximation, convergents, mediants } from '@stageyard/libs/units';
import { ProblemError } from '../common/errors.js';
import { HOUSE_RULES } from '../house-rules/house-rules.js';
import { SearchPool } from '../workers/search-pool.js';
import { StopFlag } from '../workers/stop-flag.js';
import { type FractionDto } from './dto/fraction.dto.js';
import { type FractionsInputDto } from './dto/fractions-input.dto.js';
import { type FractionsDto } from './dto/fractions.dto.js';
import { type GearGeometryDto } from './dto/gear-geometry.dto.js';
import { type MeshGeometryDto } from './dto/mesh-geometry.dto.js';
import { type MeshInputDto } from './dto/mesh-input.dto.js';
import { type OptionRequestDto } from './dto/option-request.dto.js';
import { type ShiftInputDto } from './dto/shift-input.dto.js';
import { type ShiftResultDto } from './dto/shift-result.dto.js';

/** The libraries, answering over HTTP. They refuse bad figures themselves, by InputError. */
@Injectable()
export class CalcService {
  constructor(private readonly searches: SearchPool) {}

  gear(input: GearInput): GearGeometryDto {
    return gearGeometry(input);
  }

  mesh(input: MeshInputDto): MeshGeometryDto {
    return meshGeometry(input);
  }

  shift(input: ShiftInputDto): ShiftResultDto {
    return shiftForPolicy(input);
  }

  /**
   * Runs on a worker thread, so that others are answered meanwhile. Past the house time limit the best found so far is
   * the answer, not complete.
   * @throws InputError naming every field at fault; ProblemError 503 when no thread came free in that time
   */
  async options(input: OptionRequestDto): Promise<SearchOutcome> {
    const request = validateOptionRequest(input);
    const timeLimitMs = HOUSE_RULES.searchTimeLimitMs;
    const stopFlag = new StopFlag();
    const timer = setTimeout(() => stopFlag.raise(), timeLimitMs);
    let started = false;
    try {
      const onStart = () => (started = true);
      const outcome = await this.searches.run(request, { timeLimitMs, stopFlag, onStart });
      if (started || outcome.search.complete) return outcome;
      throw busy();
    } finally {
      clearTimeout(timer);
    }
  }

  fractions({ target, tolerancePercent, maxTeeth, limit }: FractionsInputDto): FractionsDto {
    const limits = {
      ...(maxTeeth === undefined ? {} : { maxTerm: maxTeeth }),
      ...(limit === undefined ? {} : { limit }),
      ...(tolerancePercent === undefined ? {} : { tolerancePercent }),
    };
    return {
      mediants: mediants(target, limits).map(toFraction),
      convergents: convergents(target, limits).map(toFraction),
    };
  }
}

/** Whole numbers travel as digits: they may be longer than a JSON number carries exactly. */
function toFraction({ numerator, denominator, ...figures }: Approximation): FractionDto {
  return { numerator: numerator.toString(), denominator: denominator.toString(), ...figures };
}

function busy(): ProblemError {
  const message = `Other searches kept the server busy for ${HOUSE_RULES.searchTimeLimitMs / 1000} s. Try again in a minute.`;
  return new ProblemError(503, 'busy', message);
}

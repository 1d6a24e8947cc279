import { ApiHideProperty, ApiSchema } from '@nestjs/swagger';
import { PRESSURE_ANGLES_DEG } from '@stageyard/libs/gear-geometry';
import { Allow } from 'class-validator';
import { EnvelopeDto } from './envelope.dto.js';
import { LibraryField, LibraryFigure, LibraryObject } from './library-field.decorator.js';
import { RatioTargetDto } from './ratio-target.dto.js';
import { StageRatioLimitsDto } from './stage-ratio-limits.dto.js';
import { TeethRangesDto } from './teeth-ranges.dto.js';
import { WholeRangeDto } from './whole-range.dto.js';

/** What an option search is asked for. The planner checks every figure; see `validateOptionRequest`. */
@ApiSchema({ name: 'OptionRequest' })
export class OptionRequestDto {
  @LibraryObject(() => RatioTargetDto, 'Ratio and tolerance', true)
  ratio!: RatioTargetDto;

  @LibraryObject(() => WholeRangeDto, 'Number of stages, 1 to 3', true)
  stages!: WholeRangeDto;

  @LibraryObject(() => TeethRangesDto, 'Tooth numbers', true)
  teeth!: TeethRangesDto;

  @LibraryField({
    type: 'array',
    items: { type: 'number' },
    minItems: 1,
    maxItems: 30,
    description: 'Normal modules (mm); without a load the smallest is used',
    example: [1, 1.25],
  })
  modules!: number[];

  @LibraryFigure({
    description: 'Normal pressure angle',
    unit: 'degrees',
    values: PRESSURE_ANGLES_DEG,
    optional: true,
    default: 20,
  })
  pressureAngleDeg?: number;

  @LibraryFigure({
    description: 'Helix angle',
    unit: 'degrees',
    bounds: { min: 0, max: 45 },
    optional: true,
    default: 0,
  })
  helixAngleDeg?: number;

  @LibraryFigure({
    description: 'Face width',
    unit: 'modules',
    bounds: { min: 1, max: 100 },
    optional: true,
    default: 10,
  })
  faceWidthFactor?: number;

  @LibraryField({ enum: ['none', 'clear-undercut'], required: false, default: 'none' })
  shiftPolicy?: 'none' | 'clear-undercut';

  @LibraryFigure({
    description: 'Least contact ratio of every stage',
    bounds: { min: 0, max: 5 },
    optional: true,
    default: 1.2,
  })
  leastContactRatio?: number;

  @LibraryFigure({
    description: 'Added to the zero-backlash distance of every stage',
    unit: 'modules',
    bounds: { min: 0, max: 2 },
    optional: true,
    default: 0,
  })
  centreDistanceAllowance?: number;

  @LibraryField({ enum: ['allow', 'refuse'], required: false, default: 'allow' })
  undercut?: 'allow' | 'refuse';

  @LibraryObject(() => StageRatioLimitsDto, 'Limits on the ratio of every stage')
  stageRatio?: StageRatioLimitsDto;

  @LibraryObject(() => EnvelopeDto, 'Space for the box')
  envelope?: EnvelopeDto;

  @LibraryField({ enum: ['in-line'], required: false, default: 'in-line' })
  arrangement?: 'in-line';

  @LibraryField({
    enum: ['same', 'opposite', 'any'],
    required: false,
    default: 'any',
    description: 'Sense of rotation of the output against the input',
  })
  direction?: 'same' | 'opposite' | 'any';

  @LibraryField({ enum: ['any'], required: false, default: 'any' })
  source?: 'any';

  @LibraryField({ enum: ['centre-distance', 'ratio-error', 'mass'], description: 'What ranks the options' })
  objective!: 'centre-distance' | 'ratio-error' | 'mass';

  @LibraryFigure({
    description: 'Most options returned',
    bounds: { min: 1, max: 500 },
    whole: true,
    optional: true,
    default: 50,
  })
  limit?: number;

  @LibraryField({
    enum: ['all', 'each-count'],
    required: false,
    default: 'all',
    description:
      'Whether the stage counts compete for the places or each keeps its own best; briefs: each-count',
  })
  bestOf?: 'all' | 'each-count';

  /** Known to the interface and refused by the planner with the reason, instead of as an unknown field. */
  @ApiHideProperty()
  @Allow()
  load?: unknown;

  @ApiHideProperty()
  @Allow()
  centreDistanceGrade?: unknown;
}

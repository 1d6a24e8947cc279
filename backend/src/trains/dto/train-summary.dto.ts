import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { type TrainFigures } from '@stageyard/libs/train-planner';
import { BoxDto } from '../../option-searches/dto/box.dto.js';
import { ExactRatioDto } from '../../option-searches/dto/train-option.dto.js';
import { REVISION_STATES, type RevisionState, type Train } from '../entities/train.entity.js';
import { TrainSpecDto } from './train-spec.dto.js';

/** A brief by its code and title. */
@ApiSchema({ name: 'BriefRef' })
export class BriefRefDto {
  @ApiProperty({ type: 'string' })
  id!: string;

  @ApiProperty({ type: 'string', example: 'B-0001' })
  code!: string;

  @ApiProperty({ type: 'string' })
  title!: string;
}

/** A train in a list. */
@ApiSchema({ name: 'TrainSummary' })
export class TrainSummaryDto {
  @ApiProperty({ type: 'string', example: 'T-0001' })
  code!: string;

  @ApiProperty({ type: 'string' })
  title!: string;

  @ApiProperty({ type: 'string', example: 'A' })
  revision!: string;

  @ApiProperty({ enum: REVISION_STATES, enumName: 'RevisionState' })
  state!: RevisionState;

  @ApiProperty({ type: BriefRefDto, nullable: true })
  brief!: BriefRefDto | null;

  @ApiProperty({ type: 'string', description: 'Name of the person it belongs to' })
  owner!: string;

  @ApiProperty({ type: 'integer' })
  version!: number;

  @ApiProperty({ type: 'string', format: 'date-time' })
  createdAt!: string;

  @ApiProperty({ type: 'string', format: 'date-time' })
  updatedAt!: string;

  @ApiProperty({ type: TrainSpecDto })
  spec!: TrainSpecDto;

  @ApiProperty({ type: ExactRatioDto })
  ratio!: ExactRatioDto;

  @ApiProperty({ type: 'integer' })
  stageCount!: number;

  @ApiProperty({ type: 'number', description: 'mm' })
  centreDistanceSum!: number;

  @ApiProperty({ type: 'number', description: 'kg, solid discs' })
  mass!: number;

  @ApiProperty({ type: BoxDto })
  box!: BoxDto;

  @ApiProperty({ type: 'integer', description: 'Checks that fail' })
  fails!: number;

  @ApiProperty({ type: 'integer', description: 'Checks that are marginal' })
  marginals!: number;
}

/** @param train with its `owner` and `brief` loaded */
export function toTrainSummary(train: Train, figures: TrainFigures): TrainSummaryDto {
  const { brief, spec } = train;
  const count = (verdict: 'fails' | 'marginal') =>
    figures.checks.filter((check) => check.verdict === verdict).length;
  return {
    code: train.code,
    title: train.title,
    revision: train.revision,
    state: train.state,
    brief: brief ? { id: String(brief.id), code: brief.code, title: brief.title } : null,
    owner: train.owner?.name ?? '',
    version: train.version,
    createdAt: train.createdAt,
    updatedAt: train.updatedAt,
    spec,
    ratio: figures.ratio,
    stageCount: spec.stages.length,
    centreDistanceSum: figures.centreDistanceSum,
    mass: figures.mass,
    box: figures.box,
    fails: count('fails'),
    marginals: count('marginal'),
  };
}

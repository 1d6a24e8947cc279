import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { type Objective } from '@stageyard/libs/train-planner';
import { SearchSummaryDto } from '../../option-searches/dto/search-summary.dto.js';
import { type Brief, BRIEF_STANDINGS, type BriefStanding } from '../entities/brief.entity.js';

@ApiSchema({ name: 'StageCounts' })
export class StageCountsDto {
  @ApiProperty({ type: 'integer' })
  min!: number;

  @ApiProperty({ type: 'integer' })
  max!: number;
}

/** A brief in a list. */
@ApiSchema({ name: 'BriefSummary' })
export class BriefSummaryDto {
  @ApiProperty({ type: 'string' })
  id!: string;

  @ApiProperty({ type: 'string', example: 'B-0001' })
  code!: string;

  @ApiProperty({ type: 'string' })
  title!: string;

  @ApiProperty({
    enum: BRIEF_STANDINGS,
    enumName: 'BriefStanding',
    description: 'open: not searched as it stands; searched; adopted: a train was taken from it',
  })
  standing!: BriefStanding;

  @ApiProperty({ type: 'string', description: 'Decimal' })
  ratioTarget!: string;

  @ApiProperty({ type: 'string', description: 'Decimal, per cent' })
  tolerancePercent!: string;

  @ApiProperty({ type: 'string', enum: ['centre-distance', 'ratio-error', 'mass'] })
  objective!: Objective;

  @ApiProperty({ type: StageCountsDto })
  stages!: StageCountsDto;

  @ApiProperty({ type: 'string', description: 'Name of the person it belongs to' })
  owner!: string;

  @ApiProperty({ type: 'integer' })
  version!: number;

  @ApiProperty({ type: 'string', format: 'date-time' })
  createdAt!: string;

  @ApiProperty({ type: 'string', format: 'date-time' })
  updatedAt!: string;

  @ApiProperty({ type: SearchSummaryDto, nullable: true })
  latestSearch!: SearchSummaryDto | null;

  @ApiProperty({ type: 'integer', description: 'Options pinned' })
  pinCount!: number;
}

/** What a list row needs beside the brief itself. */
export interface BriefSurroundings {
  latestSearch: SearchSummaryDto | null;
  pinCount: number;
}

/** @param brief with its `owner` loaded */
export function toBriefSummary(brief: Brief, { latestSearch, pinCount }: BriefSurroundings): BriefSummaryDto {
  const { ratio, stages, objective } = brief.requirement;
  return {
    id: String(brief.id),
    code: brief.code,
    title: brief.title,
    standing: brief.standing,
    ratioTarget: String(ratio.target),
    tolerancePercent: String(ratio.tolerancePercent),
    objective,
    stages: { min: stages.min, max: stages.max },
    owner: brief.owner?.name ?? '',
    version: brief.version,
    createdAt: brief.createdAt,
    updatedAt: brief.updatedAt,
    latestSearch,
    pinCount,
  };
}

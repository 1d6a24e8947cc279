import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { SearchSummaryDto } from '../../option-searches/dto/search-summary.dto.js';
import { type Brief, BRIEF_STANDINGS, type BriefStanding } from '../entities/brief.entity.js';
import { type Requirement } from '../requirement.js';
import { PinDto } from './pin.dto.js';
import { RequirementDto } from './requirement.dto.js';

/** A train by its code and title. */
@ApiSchema({ name: 'TrainRef' })
export class TrainRefDto {
  @ApiProperty({ type: 'string', example: 'T-0001' })
  code!: string;

  @ApiProperty({ type: 'string' })
  title!: string;
}

/** A brief with its requirement and its pins. */
@ApiSchema({ name: 'Brief' })
export class BriefDto {
  @ApiProperty({ type: 'string' })
  id!: string;

  @ApiProperty({ type: 'string', example: 'B-0001' })
  code!: string;

  @ApiProperty({ type: 'string' })
  title!: string;

  @ApiProperty({ type: 'string' })
  note!: string;

  @ApiProperty({ type: RequirementDto })
  requirement!: Requirement;

  @ApiProperty({ enum: BRIEF_STANDINGS, enumName: 'BriefStanding' })
  standing!: BriefStanding;

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

  @ApiProperty({ type: [PinDto], description: 'In the order they were pinned' })
  pins!: PinDto[];

  @ApiProperty({ type: [TrainRefDto], description: 'Trains taken from this brief' })
  trains!: TrainRefDto[];
}

/** @param brief with its `owner` loaded */
export function toBriefDto(
  brief: Brief,
  around: Pick<BriefDto, 'latestSearch' | 'pins' | 'trains'>,
): BriefDto {
  return {
    id: String(brief.id),
    code: brief.code,
    title: brief.title,
    note: brief.note,
    requirement: brief.requirement,
    standing: brief.standing,
    owner: brief.owner?.name ?? '',
    version: brief.version,
    createdAt: brief.createdAt,
    updatedAt: brief.updatedAt,
    ...around,
  };
}

import { ApiPropertyOptional } from '@nestjs/swagger';
import { Transform } from 'class-transformer';
import { IsBoolean, IsIn, IsOptional } from 'class-validator';
import { booleanFromQuery, ListQueryDto, PageOf } from '../../common/list-query.js';
import { BRIEF_STANDINGS, type BriefStanding } from '../entities/brief.entity.js';
import { BriefSummaryDto } from './brief-summary.dto.js';
import { ApiSchema } from '@nestjs/swagger';

export const BRIEF_SORTS = ['code', 'title', 'standing', 'owner', 'createdAt', 'updatedAt'] as const;
export type BriefSort = (typeof BRIEF_SORTS)[number];

/** Filters of the list of briefs; `text` looks in code, title and note. */
export class BriefQueryDto extends ListQueryDto {
  @ApiPropertyOptional({ type: 'boolean', description: 'Only those of the person who asks' })
  @IsOptional()
  @Transform(booleanFromQuery)
  @IsBoolean()
  mine?: boolean;

  @ApiPropertyOptional({ enum: BRIEF_STANDINGS, enumName: 'BriefStanding' })
  @IsOptional()
  @IsIn(BRIEF_STANDINGS)
  standing?: BriefStanding;
}

@ApiSchema({ name: 'BriefPage' })
export class BriefPageDto extends PageOf(BriefSummaryDto) {}

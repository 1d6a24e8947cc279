import { ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import { Transform } from 'class-transformer';
import { IsBoolean, IsIn, IsOptional } from 'class-validator';
import { booleanFromQuery, ListQueryDto, PageOf } from '../../common/list-query.js';
import { REVISION_STATES, type RevisionState } from '../entities/train.entity.js';
import { TrainSummaryDto } from './train-summary.dto.js';

export const TRAIN_SORTS = ['code', 'title', 'owner', 'createdAt', 'updatedAt'] as const;
export type TrainSort = (typeof TRAIN_SORTS)[number];

/** Filters of the list of trains; `text` looks in code, title and note. */
export class TrainQueryDto extends ListQueryDto {
  @ApiPropertyOptional({ type: 'boolean', description: 'Only those of the person who asks' })
  @IsOptional()
  @Transform(booleanFromQuery)
  @IsBoolean()
  mine?: boolean;

  @ApiPropertyOptional({ enum: REVISION_STATES, enumName: 'RevisionState' })
  @IsOptional()
  @IsIn(REVISION_STATES)
  revisionState?: RevisionState;
}

@ApiSchema({ name: 'TrainPage' })
export class TrainPageDto extends PageOf(TrainSummaryDto) {}

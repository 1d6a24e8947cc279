import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { BriefSummaryDto } from '../../briefs/dto/brief-summary.dto.js';
import { PartSummaryDto } from '../../parts/dto/part-summary.dto.js';
import { TrainSummaryDto } from '../../trains/dto/train-summary.dto.js';
import { OverviewCountsDto } from './overview-counts.dto.js';

/** What a person finds on the first page; each list shows the last changed first. */
@ApiSchema({ name: 'Overview' })
export class OverviewDto {
  @ApiProperty({ type: OverviewCountsDto })
  counts!: OverviewCountsDto;

  @ApiProperty({ type: [BriefSummaryDto], description: 'Briefs that this person owns' })
  briefs!: BriefSummaryDto[];

  @ApiProperty({ type: [TrainSummaryDto], description: 'Trains that this person owns' })
  trains!: TrainSummaryDto[];

  @ApiProperty({ type: [PartSummaryDto], description: 'Drafts to clear, for people who may change parts' })
  draftParts!: PartSummaryDto[];
}

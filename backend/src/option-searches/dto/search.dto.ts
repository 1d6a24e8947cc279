import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { RequirementDto } from '../../briefs/dto/requirement.dto.js';
import { type Requirement } from '../../briefs/requirement.js';
import { type SearchProgress } from '../../workers/search-task.js';
import { type OptionSearch } from '../entities/option-search.entity.js';
import { SearchOutcomeDto } from './search-outcome.dto.js';
import { SearchProgressDto } from './search-progress.dto.js';
import { SearchSummaryDto, toSearchSummary } from './search-summary.dto.js';

/** A search with what was asked, how far it is, and what came out. */
@ApiSchema({ name: 'Search' })
export class SearchDto extends SearchSummaryDto {
  @ApiProperty({ type: RequirementDto, description: 'The requirement as it was searched' })
  request!: Requirement;

  @ApiProperty({
    type: SearchProgressDto,
    nullable: true,
    description: 'Null before it runs and after it ended',
  })
  progress!: SearchProgressDto | null;

  @ApiProperty({ type: SearchOutcomeDto, nullable: true, description: 'Null until it ended' })
  outcome!: SearchOutcomeDto | null;
}

/** @param progress the latest report of a running search */
export function toSearchDto(search: OptionSearch, progress: SearchProgress | null): SearchDto {
  return { ...toSearchSummary(search), request: search.request, progress, outcome: search.outcome };
}

import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { type OptionSearch, SEARCH_STATES, type SearchState } from '../entities/option-search.entity.js';

/** A search without its options. */
@ApiSchema({ name: 'SearchSummary' })
export class SearchSummaryDto {
  @ApiProperty({ type: 'string' })
  id!: string;

  @ApiProperty({ type: 'string' })
  briefId!: string;

  @ApiProperty({
    type: 'integer',
    description:
      'Version of the brief that was searched; another than the brief has now means it changed since',
  })
  briefVersion!: number;

  @ApiProperty({ enum: SEARCH_STATES, enumName: 'SearchState' })
  state!: SearchState;

  @ApiProperty({ type: 'string', format: 'date-time' })
  startedAt!: string;

  @ApiProperty({ type: 'string', format: 'date-time', nullable: true })
  finishedAt!: string | null;

  @ApiProperty({ type: 'integer', nullable: true, description: 'Options found; null while it runs' })
  optionCount!: number | null;

  @ApiProperty({ type: 'boolean', nullable: true, description: 'True when nothing outranks what was found' })
  complete!: boolean | null;

  @ApiProperty({ type: 'string', nullable: true, description: 'Why it failed or stopped, in words' })
  message!: string | null;

  @ApiProperty({ type: 'string', description: 'Name of the person who started it' })
  by!: string;
}

/** @param search with its `startedBy` loaded */
export function toSearchSummary(search: OptionSearch): SearchSummaryDto {
  return {
    id: String(search.id),
    briefId: String(search.briefId),
    briefVersion: search.briefVersion,
    state: search.state,
    startedAt: search.startedAt,
    finishedAt: search.finishedAt,
    optionCount: search.optionCount,
    complete: search.complete,
    message: search.message,
    by: search.startedBy?.name ?? '',
  };
}

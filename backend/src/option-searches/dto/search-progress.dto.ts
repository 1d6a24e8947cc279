import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { type SearchProgress } from '../../workers/search-task.js';

/** How far a running search has come. */
@ApiSchema({ name: 'SearchProgress' })
export class SearchProgressDto implements SearchProgress {
  @ApiProperty({ type: 'string', description: 'What it does at present, in words' })
  phase!: string;

  @ApiProperty({ type: 'integer', description: 'Stage count looked at' })
  stages!: number;

  @ApiProperty({ type: 'number', description: 'Combinations settled in this phase' })
  settled!: number;

  @ApiProperty({ type: 'number', description: 'Combinations of this phase' })
  total!: number;

  @ApiProperty({ type: 'number', description: 'Options found so far' })
  found!: number;
}

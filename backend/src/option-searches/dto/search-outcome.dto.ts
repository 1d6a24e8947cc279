import { ApiProperty, ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import { type SearchOutcome, type WhyNot } from '@stageyard/libs/train-planner';
import { TrainOptionDto } from './train-option.dto.js';

/** Why a stage count gives no option, or none among the best. */
@ApiSchema({ name: 'WhyNot' })
export class WhyNotDto implements WhyNot {
  @ApiProperty({ type: 'integer' })
  stages!: number;

  @ApiProperty({ type: 'string', description: 'The limit in the way, such as `teeth.wheel.max`' })
  limit!: string;

  @ApiProperty({ type: 'string' })
  message!: string;

  @ApiProperty({
    oneOf: [{ type: 'number' }, { type: 'string' }],
    nullable: true,
    description: 'The least change of that limit that works, in its own unit',
  })
  nearest!: number | string | null;

  @ApiPropertyOptional({
    type: 'object',
    additionalProperties: true,
    description: 'Merged over the request, this makes an option of this stage count appear',
  })
  relaxed?: WhyNot['relaxed'];
}

@ApiSchema({ name: 'SearchTally' })
export class SearchTallyDto {
  @ApiProperty({ type: 'boolean', description: 'True when nothing in the space outranks what is returned' })
  complete!: boolean;

  @ApiProperty({ type: 'number', description: 'Trains settled, looked at or ruled out by a bound' })
  combinations!: number;

  @ApiProperty({ type: 'number', description: 'ms' })
  elapsedMs!: number;
}

@ApiSchema({ name: 'SearchOutcome' })
export class SearchOutcomeDto implements Pick<SearchOutcome, 'search' | 'whyNot'> {
  @ApiProperty({ type: [TrainOptionDto] })
  options!: TrainOptionDto[];

  @ApiProperty({ type: SearchTallyDto })
  search!: SearchTallyDto;

  @ApiProperty({ type: [WhyNotDto] })
  whyNot!: WhyNotDto[];
}

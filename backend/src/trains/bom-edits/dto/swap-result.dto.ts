import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { TrainDto } from '../../dto/train.dto.js';

/** One thing that a swap changes. */
@ApiSchema({ name: 'SwapChange' })
export class SwapChangeDto {
  @ApiProperty({ type: 'string', description: '`Part`, `Mass`, `Flag`, `Finding`, `Price`, `Arrival` …' })
  what!: string;

  @ApiProperty({ type: 'string', description: 'Blank: there was none' })
  before!: string;

  @ApiProperty({ type: 'string', description: 'Blank: there is none' })
  after!: string;

  @ApiProperty({
    type: 'string',
    enum: ['better', 'worse', 'same', null],
    nullable: true,
    description: 'Null where it is neither',
  })
  verdict!: 'better' | 'worse' | 'same' | null;
}

/** A check as it stood or stands. */
@ApiSchema({ name: 'SwapCheckState' })
export class SwapCheckStateDto {
  @ApiProperty({ type: 'number', nullable: true })
  value!: number | null;

  @ApiProperty({ enum: ['passes', 'marginal', 'fails'], enumName: 'Verdict' })
  verdict!: 'passes' | 'marginal' | 'fails';
}

/** A check whose value or verdict a swap changes. */
@ApiSchema({ name: 'SwapCheck' })
export class SwapCheckDto {
  @ApiProperty({ type: 'string' })
  label!: string;

  @ApiProperty({
    type: 'integer',
    nullable: true,
    description: '0 for the first stage; null: the whole train',
  })
  stage!: number | null;

  @ApiProperty({ type: 'string' })
  unit!: string;

  @ApiProperty({ type: SwapCheckStateDto, nullable: true, description: 'Null: there was no such check' })
  before!: SwapCheckStateDto | null;

  @ApiProperty({ type: SwapCheckStateDto, nullable: true, description: 'Null: there is no such check' })
  after!: SwapCheckStateDto | null;
}

/** What a swap changes; the train only when it was booked. */
@ApiSchema({ name: 'SwapResult' })
export class SwapResultDto {
  @ApiProperty({ type: TrainDto, nullable: true, description: 'Null after a dry run' })
  train!: TrainDto | null;

  @ApiProperty({ type: [SwapChangeDto] })
  changes!: SwapChangeDto[];

  @ApiProperty({ type: [SwapCheckDto], description: 'Only checks that change' })
  checks!: SwapCheckDto[];
}

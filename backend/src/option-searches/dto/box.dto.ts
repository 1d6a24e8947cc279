import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { type Box } from '@stageyard/libs/train-planner';

/** Outer size: length and height across the shafts, width along them; mm. */
@ApiSchema({ name: 'Box' })
export class BoxDto implements Box {
  @ApiProperty({ type: 'number' })
  length!: number;

  @ApiProperty({ type: 'number' })
  width!: number;

  @ApiProperty({ type: 'number' })
  height!: number;
}

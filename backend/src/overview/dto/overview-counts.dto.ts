import { ApiProperty, ApiSchema } from '@nestjs/swagger';

/** How many there are of everything the person may read. */
@ApiSchema({ name: 'OverviewCounts' })
export class OverviewCountsDto {
  @ApiProperty({ type: 'integer' })
  briefs!: number;

  @ApiProperty({ type: 'integer' })
  trains!: number;

  @ApiProperty({ type: 'integer' })
  parts!: number;

  @ApiProperty({ type: 'integer', description: 'Active ones' })
  suppliers!: number;
}

import { ApiProperty, ApiSchema } from '@nestjs/swagger';

/** Something that a check found out about a gear, a pair or a train. */
@ApiSchema({ name: 'Finding' })
export class FindingDto {
  @ApiProperty({ type: 'string', example: 'interference' })
  code!: string;

  @ApiProperty({ enum: ['fail', 'marginal', 'note'], enumName: 'FindingSeverity' })
  severity!: 'fail' | 'marginal' | 'note';

  @ApiProperty({ type: 'string' })
  message!: string;

  @ApiProperty({ type: 'number', required: false, description: 'The figure that was checked' })
  value?: number;

  @ApiProperty({ type: 'number', required: false, description: 'The limit it was checked against' })
  limit?: number;
}

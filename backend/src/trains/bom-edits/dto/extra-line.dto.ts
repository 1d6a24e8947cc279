import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { EXTRA_LINE_UNITS, type ExtraLine } from '../../bom-edits.js';

/** An added line as it is kept. */
@ApiSchema({ name: 'ExtraLine' })
export class ExtraLineDto implements ExtraLine {
  @ApiProperty({ type: 'string', description: 'Stays with the line for good' })
  id!: string;

  @ApiProperty({ type: 'string', nullable: true })
  partNumber!: string | null;

  @ApiProperty({ type: 'string' })
  description!: string;

  @ApiProperty({ type: 'number' })
  quantity!: number;

  @ApiProperty({ enum: EXTRA_LINE_UNITS, enumName: 'LineUnit' })
  unit!: ExtraLine['unit'];

  @ApiProperty({ type: 'string' })
  note!: string;
}

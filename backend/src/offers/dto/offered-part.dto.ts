import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { PART_KINDS, PART_STANDINGS, type PartKind, type PartStanding } from '../../parts/part-kinds.js';
import { PART_UNITS, type PartUnit } from '../../parts/part-unit.js';

/** The part that an offer is for. */
@ApiSchema({ name: 'OfferedPart' })
export class OfferedPartDto {
  @ApiProperty({ type: 'string', example: 'KW-00417' })
  number!: string;

  @ApiProperty({ type: 'string' })
  description!: string;

  @ApiProperty({ enum: PART_KINDS, enumName: 'PartKind' })
  kind!: PartKind;

  @ApiProperty({ enum: PART_STANDINGS, enumName: 'PartStanding' })
  standing!: PartStanding;

  @ApiProperty({
    enum: PART_UNITS,
    enumName: 'PartUnit',
    description: 'All quantities of the offer are in it',
  })
  unit!: PartUnit;
}

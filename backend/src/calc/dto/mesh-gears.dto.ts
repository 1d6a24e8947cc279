import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { GearGeometryDto } from './gear-geometry.dto.js';

/** The two gears of a pair. */
@ApiSchema({ name: 'MeshGears' })
export class MeshGearsDto {
  @ApiProperty({ type: GearGeometryDto })
  pinion!: GearGeometryDto;

  @ApiProperty({ type: GearGeometryDto })
  wheel!: GearGeometryDto;
}

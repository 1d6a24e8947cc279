import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { GearGeometryDto } from '../../calc/dto/gear-geometry.dto.js';
import { type Part } from '../entities/part.entity.js';
import { toothedGeometry } from '../part-geometry.js';
import { PartSummaryDto, toPartSummaryDto } from './part-summary.dto.js';

/** One part with its computed geometry. */
@ApiSchema({ name: 'Part' })
export class PartDto extends PartSummaryDto {
  @ApiProperty({
    type: GearGeometryDto,
    nullable: true,
    description: 'Computed from the attributes of a gear or pinion shaft; null for other kinds',
  })
  computed!: GearGeometryDto | null;
}

/** @param shelf as for `toPartSummaryDto` */
export function toPartDto(part: Part, shelf: number | null): PartDto {
  return { ...toPartSummaryDto(part, shelf), computed: toothedGeometry(part.kind, part.attributes) };
}

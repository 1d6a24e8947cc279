import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { MeshGeometryDto } from './mesh-geometry.dto.js';

/** The profile shifts that a policy chose, and the pair with them. */
@ApiSchema({ name: 'ShiftResult' })
export class ShiftResultDto {
  @ApiProperty({ type: 'number', description: 'Profile shift coefficient of the pinion' })
  pinionShift!: number;

  @ApiProperty({ type: 'number', description: 'Profile shift coefficient of the wheel' })
  wheelShift!: number;

  @ApiProperty({ type: MeshGeometryDto, description: 'The pair at its zero-backlash distance' })
  mesh!: MeshGeometryDto;
}

import { ApiProperty, ApiSchema } from '@nestjs/swagger';

/** Specific sliding at the roots. */
@ApiSchema({ name: 'SpecificSliding' })
export class SpecificSlidingDto {
  @ApiProperty({ type: 'number', nullable: true, description: 'At the pinion root; null when infinite' })
  pinionRoot!: number | null;

  @ApiProperty({ type: 'number', nullable: true, description: 'At the wheel root; null when infinite' })
  wheelRoot!: number | null;
}

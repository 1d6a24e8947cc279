import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { FractionDto } from './fraction.dto.js';

/** Fractions that approach a ratio, in the order found. */
@ApiSchema({ name: 'Fractions' })
export class FractionsDto {
  @ApiProperty({ type: [FractionDto], description: 'Successive mediants (A. Brocot)' })
  mediants!: FractionDto[];

  @ApiProperty({ type: [FractionDto], description: 'Convergents of the continued fraction' })
  convergents!: FractionDto[];
}

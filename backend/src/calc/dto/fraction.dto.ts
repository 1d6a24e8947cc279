import { ApiProperty, ApiSchema } from '@nestjs/swagger';

/** A fraction near the target, in lowest terms. */
@ApiSchema({ name: 'Fraction' })
export class FractionDto {
  @ApiProperty({ type: 'string', pattern: '^[0-9]+$', example: '191' })
  numerator!: string;

  @ApiProperty({ type: 'string', pattern: '^[0-9]+$', example: '23' })
  denominator!: string;

  @ApiProperty({ type: 'number', description: 'Signed error against the target (per cent)' })
  errorPercent!: number;

  @ApiProperty({ type: 'boolean', required: false, description: 'Present when a tolerance was given' })
  withinTolerance?: boolean;
}

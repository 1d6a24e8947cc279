import { ApiSchema } from '@nestjs/swagger';
import { FieldFigure } from '../../common/field-figure.decorator.js';
import { DecimalField } from './decimal-field.decorator.js';

/** A ratio to be approached by fractions of small terms. */
@ApiSchema({ name: 'FractionsInput' })
export class FractionsInputDto {
  @DecimalField({ description: 'Target ratio, read exactly; above 0', example: '8.3043478' })
  target!: string;

  @DecimalField({
    description: 'Marks each fraction as inside or outside this tolerance (per cent); it does not filter',
    optional: true,
  })
  tolerancePercent?: string;

  @FieldFigure({
    description: 'Largest numerator or denominator',
    min: 1,
    max: 1_000_000,
    whole: true,
    optional: true,
    default: 200,
  })
  maxTeeth?: number;

  @FieldFigure({
    description: 'Most fractions of each kind',
    min: 1,
    max: 1000,
    whole: true,
    optional: true,
    default: 20,
  })
  limit?: number;
}

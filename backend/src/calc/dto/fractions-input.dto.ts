import { ApiSchema } from '@nestjs/swagger';
import { FieldFigure } from '../../common/field-figure.decorator.js';
import { LibraryField } from './library-field.decorator.js';

/** A ratio to be approached by fractions of small terms. */
@ApiSchema({ name: 'FractionsInput' })
export class FractionsInputDto {
  @LibraryField({
    type: 'string',
    description: 'Target ratio as a decimal, read exactly; above 0',
    example: '8.3043478',
  })
  target!: string;

  @LibraryField({
    oneOf: [{ type: 'number' }, { type: 'string' }],
    required: false,
    description: 'Marks each fraction as inside or outside this tolerance (per cent); it does not filter',
  })
  tolerancePercent?: number | string;

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

import { ApiSchema } from '@nestjs/swagger';
import { LibraryField } from './library-field.decorator.js';

const DECIMAL = [{ type: 'string' }, { type: 'number' }];

/** Limits on wheel teeth / pinion teeth of every stage. */
@ApiSchema({ name: 'StageRatioLimits' })
export class StageRatioLimitsDto {
  @LibraryField({
    oneOf: DECIMAL,
    required: false,
    description: 'Least; 1 when left out. Below 1 allows a speed-up',
  })
  min?: string | number;

  @LibraryField({ oneOf: DECIMAL, required: false, description: 'Greatest; no limit when left out' })
  max?: string | number;
}

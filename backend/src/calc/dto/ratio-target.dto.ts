import { ApiSchema } from '@nestjs/swagger';
import { LibraryField } from './library-field.decorator.js';

const DECIMAL = [{ type: 'string' }, { type: 'number' }];

/** The ratio that is asked for; decimals are read exactly and limits are inside. */
@ApiSchema({ name: 'RatioTarget' })
export class RatioTargetDto {
  @LibraryField({ oneOf: DECIMAL, description: 'Target ratio, input speed to output speed', example: '37.5' })
  target!: string | number;

  @LibraryField({ oneOf: DECIMAL, description: 'Tolerance either side (per cent)', example: '1' })
  tolerancePercent!: string | number;
}

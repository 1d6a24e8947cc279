import { ApiSchema } from '@nestjs/swagger';
import { INPUT_LIMITS } from '@stageyard/libs/gear-geometry';
import { LibraryFigure } from './library-field.decorator.js';

/** Basic rack of the cutter, in modules (ISO 53). */
@ApiSchema({ name: 'Rack' })
export class RackDto {
  @LibraryFigure({
    description: 'Addendum',
    unit: 'modules',
    bounds: INPUT_LIMITS.addendum,
    optional: true,
    default: 1,
  })
  addendum?: number;

  @LibraryFigure({
    description: 'Dedendum',
    unit: 'modules',
    bounds: INPUT_LIMITS.dedendum,
    optional: true,
    default: 1.25,
  })
  dedendum?: number;

  @LibraryFigure({
    description: 'Tip radius; 0.38 or the largest that fits when left out',
    unit: 'modules',
    bounds: { min: 0 },
    optional: true,
  })
  tipRadius?: number;
}

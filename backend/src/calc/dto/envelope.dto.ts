import { ApiSchema } from '@nestjs/swagger';
import { LibraryFigure } from './library-field.decorator.js';

/** Outer space that the box may take; a side left out is not limited. */
@ApiSchema({ name: 'Envelope' })
export class EnvelopeDto {
  @LibraryFigure({
    description: 'Length, across the shafts',
    unit: 'mm',
    bounds: { above: 0 },
    optional: true,
  })
  length?: number;

  @LibraryFigure({ description: 'Width, along the shafts', unit: 'mm', bounds: { above: 0 }, optional: true })
  width?: number;

  @LibraryFigure({
    description: 'Height, across the shafts',
    unit: 'mm',
    bounds: { above: 0 },
    optional: true,
  })
  height?: number;

  @LibraryFigure({
    description: 'Wall thickness',
    unit: 'mm',
    bounds: { min: 0 },
    optional: true,
    default: 0,
  })
  wall?: number;
}

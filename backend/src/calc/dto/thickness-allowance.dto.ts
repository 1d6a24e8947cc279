import { ApiSchema } from '@nestjs/swagger';
import { LibraryFigure } from './library-field.decorator.js';

/** Tooth-thickness allowance, normal, at the reference diameter. */
@ApiSchema({ name: 'ThicknessAllowance' })
export class ThicknessAllowanceDto {
  @LibraryFigure({ description: 'Upper allowance', unit: 'mm', bounds: { max: 0 } })
  upper!: number;

  @LibraryFigure({ description: 'Lower allowance, not above the upper', unit: 'mm', bounds: { max: 0 } })
  lower!: number;
}

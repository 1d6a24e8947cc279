import { ApiSchema } from '@nestjs/swagger';
import { LibraryFigure } from './library-field.decorator.js';

/** Two whole numbers, both allowed. */
@ApiSchema({ name: 'WholeRange' })
export class WholeRangeDto {
  @LibraryFigure({ description: 'Least', whole: true })
  min!: number;

  @LibraryFigure({ description: 'Greatest, not below the least', whole: true })
  max!: number;
}

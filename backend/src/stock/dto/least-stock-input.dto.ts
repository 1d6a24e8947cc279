import { ApiSchema } from '@nestjs/swagger';
import { FieldFigure } from '../../common/field-figure.decorator.js';
import { MOST_STOCK } from '../thousandths.js';

/** From when on a shelf counts as low. */
@ApiSchema({ name: 'LeastStockInput' })
export class LeastStockInputDto {
  @FieldFigure({
    description: "Below this quantity, in the part's unit, the shelf is low; null: nobody watches it",
    min: 0,
    above: true,
    max: MOST_STOCK,
    nullable: true,
  })
  leastStock?: number | null;

  @FieldFigure({
    description: "The part's version that was seen before",
    min: 1,
    max: Number.MAX_SAFE_INTEGER,
    whole: true,
  })
  version!: number;
}

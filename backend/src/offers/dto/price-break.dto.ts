import { ApiSchema } from '@nestjs/swagger';
import { OFFER_LIMITS, type PriceBreak } from '@stageyard/libs/bill-of-materials';
import { FieldFigure } from '../../common/field-figure.decorator.js';

/** From this quantity on the price holds. */
@ApiSchema({ name: 'PriceBreak' })
export class PriceBreakDto implements PriceBreak {
  @FieldFigure({
    description: "From this quantity on, in the part's unit",
    min: 0,
    above: true,
    max: OFFER_LIMITS.quantity,
  })
  quantity!: number;

  @FieldFigure({
    description: "Price of `per` units, minor units of the offer's currency",
    min: 1,
    max: OFFER_LIMITS.unitPrice,
    whole: true,
  })
  unitPrice!: number;
}

import { ApiSchema } from '@nestjs/swagger';
import { FieldChoice } from '../../common/field-choice.decorator.js';
import { FieldFigure } from '../../common/field-figure.decorator.js';
import { FREIGHT_KINDS, type FreightKind, type FreightRule, GREATEST_AMOUNT } from '../supplier-terms.js';

/** What a supplier charges for freight, in minor units of the supplier's currency. */
@ApiSchema({ name: 'FreightRule' })
export class FreightRuleDto implements FreightRule {
  @FieldChoice({
    description:
      'included: in the prices; flat: charge on every order; free-from: charge below the order value freeFrom; ' +
      'as-charged: not known before',
    values: FREIGHT_KINDS,
    enumName: 'FreightKind',
  })
  kind!: FreightKind;

  @FieldFigure({
    description: 'Charge of one order, minor units; only of flat and free-from',
    min: 1,
    max: GREATEST_AMOUNT,
    whole: true,
    nullable: true,
  })
  charge: number | null = null;

  @FieldFigure({
    description: 'Order value from which freight is free, minor units; only of free-from',
    min: 1,
    max: GREATEST_AMOUNT,
    whole: true,
    nullable: true,
  })
  freeFrom: number | null = null;
}

import { ApiSchema } from '@nestjs/swagger';
import { FieldChoice } from '../../common/field-choice.decorator.js';
import { FieldFigure } from '../../common/field-figure.decorator.js';
import { FieldText } from '../../common/field-text.decorator.js';
import { FieldPartNumber } from '../../parts/part-number.js';
import { MOVEMENT_KINDS, type MovementKind } from '../movement-kinds.js';
import { MOST_STOCK } from '../thousandths.js';

/** A change of a shelf quantity. */
@ApiSchema({ name: 'MovementInput' })
export class MovementInputDto {
  @FieldPartNumber({ description: 'Part number, whatever the case of its letters' })
  number!: string;

  @FieldChoice({ description: 'Why the quantity changes', values: MOVEMENT_KINDS, enumName: 'MovementKind' })
  kind!: MovementKind;

  @FieldFigure({
    description:
      "In the part's unit. Received or issued: how much, above 0. Counted: what is there, from 0. " +
      'Corrected: what is added or, below zero, taken off',
    min: -MOST_STOCK,
    max: MOST_STOCK,
  })
  quantity!: number;

  @FieldText({ description: 'Rack, shelf, drawer', min: 1, max: 60, example: 'Rack B 3' })
  place!: string;

  @FieldText({ description: 'Why, in words; a correction needs it', max: 500, optional: true })
  reason?: string;

  @FieldText({
    description: 'Chosen by the sender, a new one for each movement: the same request sent twice books once',
    min: 8,
    max: 80,
    optional: true,
  })
  requestKey?: string;

  @FieldFigure({
    description:
      'The latest movement at the place that the sender saw, 0 for none; refused when there was another since',
    min: 0,
    max: Number.MAX_SAFE_INTEGER,
    whole: true,
    optional: true,
  })
  seenMovementId?: number;
}

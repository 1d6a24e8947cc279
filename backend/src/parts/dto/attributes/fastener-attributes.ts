import { FieldFigure } from '../../../common/field-figure.decorator.js';
import { FieldText } from '../../../common/field-text.decorator.js';

/** A screw, nut or pin. */
export class FastenerAttributes {
  @FieldText({ description: 'Thread', min: 1, max: 50, example: 'M6' })
  thread!: string;

  @FieldFigure({ description: 'Length', unit: 'mm', min: 0, above: true, max: 2000, example: 20 })
  length!: number;

  @FieldText({ description: 'Strength class', min: 1, max: 50, example: '8.8' })
  strengthClass!: string;
}

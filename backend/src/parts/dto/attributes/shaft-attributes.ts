import { FieldFigure } from '../../../common/field-figure.decorator.js';

/** A plain shaft. */
export class ShaftAttributes {
  @FieldFigure({ description: 'Diameter', unit: 'mm', min: 0, above: true, max: 2000, example: 20 })
  diameter!: number;

  @FieldFigure({ description: 'Length', unit: 'mm', min: 0, above: true, max: 10_000, example: 150 })
  length!: number;
}

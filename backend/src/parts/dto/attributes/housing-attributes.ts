import { FieldFigure } from '../../../common/field-figure.decorator.js';

/** A gearbox housing, outside dimensions. */
export class HousingAttributes {
  @FieldFigure({ description: 'Length outside', unit: 'mm', min: 0, above: true, max: 10_000, example: 220 })
  length!: number;

  @FieldFigure({ description: 'Width outside', unit: 'mm', min: 0, above: true, max: 10_000, example: 140 })
  width!: number;

  @FieldFigure({ description: 'Height outside', unit: 'mm', min: 0, above: true, max: 10_000, example: 90 })
  height!: number;

  @FieldFigure({ description: 'Wall thickness', unit: 'mm', min: 0, above: true, max: 500, example: 6 })
  wall!: number;
}

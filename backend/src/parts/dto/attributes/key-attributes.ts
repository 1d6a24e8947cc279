import { FieldFigure } from '../../../common/field-figure.decorator.js';

/** A parallel key, sizes as in DIN 6885-1. */
export class KeyAttributes {
  @FieldFigure({ description: 'Width b', unit: 'mm', min: 0, above: true, max: 200, example: 6 })
  width!: number;

  @FieldFigure({ description: 'Height h', unit: 'mm', min: 0, above: true, max: 200, example: 6 })
  height!: number;

  @FieldFigure({ description: 'Length', unit: 'mm', min: 0, above: true, max: 1000, example: 20 })
  length!: number;
}

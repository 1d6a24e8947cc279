import { FieldFigure } from '../../../common/field-figure.decorator.js';

/** A rotary shaft lip seal. */
export class SealAttributes {
  @FieldFigure({
    description: 'Shaft diameter it fits',
    unit: 'mm',
    min: 0,
    above: true,
    max: 1000,
    example: 20,
  })
  shaftDiameter!: number;

  @FieldFigure({ description: 'Outer diameter', unit: 'mm', min: 0, above: true, max: 2000, example: 35 })
  outerDiameter!: number;

  @FieldFigure({ description: 'Width', unit: 'mm', min: 0, above: true, max: 200, example: 7 })
  width!: number;
}

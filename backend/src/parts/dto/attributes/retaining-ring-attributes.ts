import { FieldFigure } from '../../../common/field-figure.decorator.js';

/** A retaining ring for shafts, sizes as in DIN 471. */
export class RetainingRingAttributes {
  @FieldFigure({
    description: 'Shaft diameter it fits',
    unit: 'mm',
    min: 0,
    above: true,
    max: 1000,
    example: 20,
  })
  shaftDiameter!: number;

  @FieldFigure({ description: 'Thickness', unit: 'mm', min: 0, above: true, max: 50, example: 1.2 })
  thickness!: number;

  @FieldFigure({
    description: 'Diameter of the groove in the shaft',
    unit: 'mm',
    min: 0,
    above: true,
    max: 1000,
    example: 19,
  })
  grooveDiameter!: number;
}

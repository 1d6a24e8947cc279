import { FieldFigure } from '../../../common/field-figure.decorator.js';
import { FieldText } from '../../../common/field-text.decorator.js';

/** A rolling or plain bearing, boundary dimensions as in ISO 15. */
export class BearingAttributes {
  @FieldFigure({ description: 'Bore', unit: 'mm', min: 0, above: true, max: 2000, example: 20 })
  bore!: number;

  @FieldFigure({ description: 'Outer diameter', unit: 'mm', min: 0, above: true, max: 3000, example: 47 })
  outerDiameter!: number;

  @FieldFigure({ description: 'Width', unit: 'mm', min: 0, above: true, max: 1000, example: 14 })
  width!: number;

  @FieldFigure({
    description: 'Basic dynamic load rating C (ISO 281)',
    unit: 'kN',
    min: 0,
    above: true,
    max: 100_000,
    nullable: true,
  })
  dynamicLoadRating: number | null = null;

  @FieldFigure({
    description: 'Basic static load rating C0 (ISO 76)',
    unit: 'kN',
    min: 0,
    above: true,
    max: 100_000,
    nullable: true,
  })
  staticLoadRating: number | null = null;

  @FieldText({ description: 'Type', min: 1, max: 100, example: 'deep groove ball' })
  type!: string;
}

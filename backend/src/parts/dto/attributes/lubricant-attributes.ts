import { FieldFigure } from '../../../common/field-figure.decorator.js';
import { FieldText } from '../../../common/field-text.decorator.js';

/** Oil or grease, in packs. */
export class LubricantAttributes {
  @FieldText({ description: 'Viscosity grade', min: 1, max: 50, example: 'ISO VG 220' })
  viscosityGrade!: string;

  @FieldFigure({ description: 'Pack volume', unit: 'litres', min: 0, above: true, max: 10_000, example: 1 })
  packVolume!: number;
}

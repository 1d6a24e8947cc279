import { FieldFigure } from '../../../common/field-figure.decorator.js';
import { ToothedAttributes } from './toothed-attributes.js';

/** A pinion cut on its shaft. */
export class PinionShaftAttributes extends ToothedAttributes {
  @FieldFigure({ description: 'Shaft diameter', unit: 'mm', min: 0, above: true, max: 2000, example: 15 })
  shaftDiameter!: number;

  @FieldFigure({ description: 'Shaft length', unit: 'mm', min: 0, above: true, max: 10_000, example: 120 })
  shaftLength!: number;
}

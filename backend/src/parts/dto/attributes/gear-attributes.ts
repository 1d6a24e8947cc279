import { FieldFigure } from '../../../common/field-figure.decorator.js';
import { ToothedAttributes } from './toothed-attributes.js';

/** A spur or helical gear with a bore. */
export class GearAttributes extends ToothedAttributes {
  @FieldFigure({ description: 'Bore', unit: 'mm', min: 0, above: true, max: 2000, example: 12 })
  bore!: number;

  @FieldFigure({
    description: 'Hub diameter',
    unit: 'mm',
    min: 0,
    above: true,
    max: 5000,
    nullable: true,
  })
  hubDiameter: number | null = null;

  @FieldFigure({
    description: 'Length of the hub beyond the face width; the bore is as long as both together',
    unit: 'mm',
    min: 0,
    above: true,
    max: 2000,
    nullable: true,
  })
  hubLength: number | null = null;
}

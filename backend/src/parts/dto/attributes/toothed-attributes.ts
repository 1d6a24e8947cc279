import { PRESSURE_ANGLES_DEG } from '@stageyard/libs/gear-geometry';
import { FieldChoice } from '../../../common/field-choice.decorator.js';
import { FieldFigure } from '../../../common/field-figure.decorator.js';
import { FieldText } from '../../../common/field-text.decorator.js';
import { HANDS, type Hand } from '../../part-kinds.js';

/** What every part with teeth states; the tip, root and form diameters follow from it and are computed. */
export abstract class ToothedAttributes {
  @FieldFigure({ description: 'Number of teeth', min: 4, max: 1000, whole: true, example: 24 })
  teeth!: number;

  @FieldFigure({ description: 'Normal module', unit: 'mm', min: 0.1, max: 50, example: 2 })
  module!: number;

  @FieldChoice({
    description: 'Normal pressure angle (degrees); 20 when left out',
    values: PRESSURE_ANGLES_DEG,
    optional: true,
    default: 20,
  })
  pressureAngleDeg: number = 20;

  @FieldFigure({
    description: 'Helix angle; 0 is a spur gear',
    unit: 'degrees',
    min: 0,
    max: 45,
    optional: true,
    default: 0,
  })
  helixAngleDeg: number = 0;

  @FieldChoice({ description: 'Hand of the helix; null for spur', values: HANDS, nullable: true })
  hand: Hand | null = null;

  @FieldFigure({
    description: 'Profile shift coefficient; null when the maker does not state it',
    min: -2,
    max: 3,
    nullable: true,
  })
  profileShift: number | null = null;

  @FieldFigure({ description: 'Face width', unit: 'mm', min: 0, above: true, max: 2000, example: 20 })
  faceWidth!: number;

  @FieldFigure({
    description: 'Upper tooth-thickness allowance, normal, at the reference diameter',
    unit: 'mm',
    min: -5,
    max: 0,
    nullable: true,
  })
  thicknessAllowanceUpper: number | null = null;

  @FieldFigure({
    description: 'Lower tooth-thickness allowance, normal, at the reference diameter',
    unit: 'mm',
    min: -5,
    max: 0,
    nullable: true,
  })
  thicknessAllowanceLower: number | null = null;

  @FieldText({
    description: 'Heat treatment',
    max: 100,
    nullable: true,
    example: 'case-hardened',
  })
  heatTreatment: string | null = null;

  @FieldText({ description: 'Hardness with its scale', max: 50, nullable: true, example: '58–62 HRC' })
  hardness: string | null = null;
}

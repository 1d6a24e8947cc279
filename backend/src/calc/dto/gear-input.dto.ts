import { ApiSchema } from '@nestjs/swagger';
import { INPUT_LIMITS, PRESSURE_ANGLES_DEG } from '@stageyard/libs/gear-geometry';
import { LibraryField, LibraryFigure, LibraryObject } from './library-field.decorator.js';
import { RackDto } from './rack.dto.js';
import { ThicknessAllowanceDto } from './thickness-allowance.dto.js';

/** One external involute gear, spur or helical. */
@ApiSchema({ name: 'GearInput' })
export class GearInputDto {
  @LibraryFigure({ description: 'Number of teeth', bounds: INPUT_LIMITS.teeth, whole: true, example: 24 })
  teeth!: number;

  @LibraryFigure({ description: 'Normal module', unit: 'mm', bounds: INPUT_LIMITS.module, example: 3 })
  module!: number;

  @LibraryFigure({
    description: 'Normal pressure angle',
    unit: 'degrees',
    values: PRESSURE_ANGLES_DEG,
    optional: true,
    default: 20,
  })
  pressureAngleDeg?: number;

  @LibraryFigure({
    description: 'Helix angle at the reference circle; 0 is a spur gear',
    unit: 'degrees',
    bounds: INPUT_LIMITS.helixAngleDeg,
    optional: true,
    default: 0,
  })
  helixAngleDeg?: number;

  @LibraryField({ enum: ['left', 'right'], required: false, description: 'Hand of the helix' })
  hand?: 'left' | 'right';

  @LibraryFigure({
    description: 'Profile shift coefficient',
    unit: 'modules',
    bounds: INPUT_LIMITS.profileShift,
    optional: true,
    default: 0,
  })
  profileShift?: number;

  @LibraryFigure({
    description: 'Tip shortening coefficient; positive makes the tip circle smaller',
    unit: 'modules',
    bounds: INPUT_LIMITS.tipShortening,
    optional: true,
    default: 0,
  })
  tipShortening?: number;

  @LibraryFigure({ description: 'Face width', unit: 'mm', bounds: INPUT_LIMITS.faceWidth, optional: true })
  faceWidth?: number;

  @LibraryObject(() => RackDto, 'Basic rack; ISO 53 profile A when left out')
  rack?: RackDto;

  @LibraryObject(() => ThicknessAllowanceDto, 'Tooth-thickness allowance; none when left out')
  thicknessAllowance?: ThicknessAllowanceDto;
}

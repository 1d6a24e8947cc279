import { ApiSchema } from '@nestjs/swagger';
import { INPUT_LIMITS } from '@stageyard/libs/gear-geometry';
import { GearInputDto } from './gear-input.dto.js';
import { LibraryField, LibraryFigure, LibraryObject } from './library-field.decorator.js';

/** Policies that this server computes; the others of the published interface are refused by name. */
export const SUPPORTED_SHIFT_POLICIES = ['none', 'clear-undercut'] as const;
export type SupportedShiftPolicy = (typeof SUPPORTED_SHIFT_POLICIES)[number];

/** A pair of gears and the rule that chooses their profile shifts. */
@ApiSchema({ name: 'ShiftInput' })
export class ShiftInputDto {
  @LibraryObject(() => GearInputDto, 'The pinion; its own shift is replaced', true)
  pinion!: GearInputDto;

  @LibraryObject(() => GearInputDto, 'The wheel; its own shift is replaced', true)
  wheel!: GearInputDto;

  @LibraryField({ enum: SUPPORTED_SHIFT_POLICIES, description: 'How the shifts are chosen' })
  policy!: SupportedShiftPolicy;

  @LibraryField({
    type: 'boolean',
    required: false,
    default: false,
    description: 'Keep the reference centre distance: the wheel takes the opposite shift',
  })
  keepReferenceDistance?: boolean;

  @LibraryFigure({
    description: 'Least tip thickness',
    unit: 'modules',
    bounds: INPUT_LIMITS.leastTipThickness,
    optional: true,
    default: 0.2,
  })
  leastTipThickness?: number;
}

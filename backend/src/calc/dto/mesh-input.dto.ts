import { ApiSchema } from '@nestjs/swagger';
import { INPUT_LIMITS } from '@stageyard/libs/gear-geometry';
import { GearInputDto } from './gear-input.dto.js';
import { LibraryFigure, LibraryObject } from './library-field.decorator.js';

/** A pair of gears and where their axes stand. */
@ApiSchema({ name: 'MeshInput' })
export class MeshInputDto {
  @LibraryObject(() => GearInputDto, 'The pinion: the gear with fewer teeth', true)
  pinion!: GearInputDto;

  @LibraryObject(() => GearInputDto, 'The wheel', true)
  wheel!: GearInputDto;

  @LibraryFigure({
    description: 'Operating centre distance; not together with an allowance',
    unit: 'mm',
    bounds: INPUT_LIMITS.centreDistance,
    optional: true,
  })
  centreDistance?: number;

  @LibraryFigure({
    description: 'Added to the zero-backlash distance; not together with a centre distance',
    unit: 'modules',
    bounds: INPUT_LIMITS.allowance,
    optional: true,
  })
  allowance?: number;

  @LibraryFigure({
    description: 'Least contact ratio that counts as enough',
    bounds: INPUT_LIMITS.leastContactRatio,
    optional: true,
    default: 1.2,
  })
  leastContactRatio?: number;
}

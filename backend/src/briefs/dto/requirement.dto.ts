import { ApiSchema } from '@nestjs/swagger';
import { LibraryFigure, LibraryObject } from '../../calc/dto/library-field.decorator.js';
import { OptionRequestDto } from '../../calc/dto/option-request.dto.js';
import { BUILD_QUANTITY, type Duty } from '../requirement.js';

@ApiSchema({ name: 'Duty' })
export class DutyDto implements Duty {
  @LibraryFigure({
    description: 'At the motor',
    unit: 'rpm',
    bounds: { above: 0, max: 100_000 },
    optional: true,
  })
  inputSpeed?: number;

  @LibraryFigure({
    description: 'At the last shaft',
    unit: 'N·m',
    bounds: { above: 0, max: 1_000_000 },
    optional: true,
  })
  outputTorque?: number;

  @LibraryFigure({
    description: 'K_A, how rough drive and load are',
    bounds: { min: 1, max: 5 },
    optional: true,
    default: 1.25,
  })
  applicationFactor?: number;
}

/** What a brief asks for: the request of an option search, with the duty and the build quantity beside it. */
@ApiSchema({ name: 'Requirement' })
export class RequirementDto extends OptionRequestDto {
  @LibraryObject(
    () => DutyDto,
    'Recorded; used for shaft speeds and sizes. Strength is not rated from it yet.',
  )
  duty?: DutyDto;

  @LibraryFigure({
    description: 'Trains to be built at once; options are priced for so many',
    bounds: BUILD_QUANTITY,
    whole: true,
    optional: true,
  })
  buildQuantity?: number;
}

import { ApiSchema } from '@nestjs/swagger';
import { LibraryObject } from './library-field.decorator.js';
import { WholeRangeDto } from './whole-range.dto.js';

/** Tooth numbers that the search may use. */
@ApiSchema({ name: 'TeethRanges' })
export class TeethRangesDto {
  @LibraryObject(() => WholeRangeDto, 'Pinion teeth, 4 to 1000', true)
  pinion!: WholeRangeDto;

  @LibraryObject(() => WholeRangeDto, 'Wheel teeth, 4 to 1000', true)
  wheel!: WholeRangeDto;
}

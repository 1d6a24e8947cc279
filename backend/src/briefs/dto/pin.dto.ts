import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { TrainOptionDto } from '../../option-searches/dto/train-option.dto.js';
import { type Pin } from '../entities/pin.entity.js';

/** An option kept for comparison. */
@ApiSchema({ name: 'Pin' })
export class PinDto {
  @ApiProperty({ type: 'string', description: "The option's key" })
  key!: string;

  @ApiProperty({ type: 'string', description: 'The search that found it' })
  searchId!: string;

  @ApiProperty({ type: TrainOptionDto, description: 'A copy, so that a later search does not lose it' })
  option!: TrainOptionDto;

  @ApiProperty({ type: 'string', format: 'date-time' })
  pinnedAt!: string;

  @ApiProperty({ type: 'string', description: 'Name of the person who pinned it' })
  by!: string;
}

/** @param pin with its `pinnedBy` loaded */
export function toPinDto(pin: Pin): PinDto {
  return {
    key: pin.optionKey,
    searchId: String(pin.searchId),
    option: pin.option,
    pinnedAt: pin.pinnedAt,
    by: pin.pinnedBy?.name ?? '',
  };
}

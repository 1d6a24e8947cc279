import { ApiProperty, ApiPropertyOptional, PartialType } from '@nestjs/swagger';
import { IsBoolean, IsInt, Min, ValidateIf } from 'class-validator';
import { UserInput } from './user-input.js';

/** A change of a person; fields left out stay as they are. */
export class UserPatch extends PartialType(UserInput, { skipNullProperties: false }) {
  @ApiProperty({ type: 'integer', minimum: 1, description: 'The version that was seen.' })
  @IsInt()
  @Min(1)
  version!: number;

  @ApiPropertyOptional({ type: Boolean, description: 'False ends every session of the person at once.' })
  @ValidateIf((_, value) => value !== undefined)
  @IsBoolean()
  active?: boolean;
}

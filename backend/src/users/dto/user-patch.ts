import { ApiProperty, PartialType } from '@nestjs/swagger';
import { IsBoolean, IsInt, IsOptional, Min } from 'class-validator';
import { ApiPropertyOptional } from '@nestjs/swagger';
import { UserInput } from './user-input.js';

/** A change of a person; fields left out stay as they are. */
export class UserPatch extends PartialType(UserInput) {
  @ApiProperty({ type: 'integer', minimum: 1, description: 'The version that was seen.' })
  @IsInt()
  @Min(1)
  version!: number;

  @ApiPropertyOptional({ type: Boolean, description: 'False ends every session of the person at once.' })
  @IsOptional()
  @IsBoolean()
  active?: boolean;
}

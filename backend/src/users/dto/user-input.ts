import { ApiProperty } from '@nestjs/swagger';
import {
  ArrayMaxSize,
  ArrayMinSize,
  ArrayUnique,
  IsEmail,
  IsIn,
  IsString,
  MaxLength,
  MinLength,
} from 'class-validator';
import { LONGEST_PASSWORD, SHORTEST_PASSWORD } from '../../auth/passwords.js';
import { type Role, ROLES } from '../../auth/permissions.js';
import { IsFilled } from '../../common/is-filled.js';

/** A new person. */
export class UserInput {
  @ApiProperty({ type: String, minLength: 1, maxLength: 120 })
  @IsFilled()
  @MaxLength(120)
  name!: string;

  @ApiProperty({ type: String, format: 'email', maxLength: 200 })
  @IsEmail()
  @MaxLength(200)
  email!: string;

  @ApiProperty({ enum: ROLES, enumName: 'Role', isArray: true, minItems: 1, maxItems: ROLES.length })
  @IsIn(ROLES, { each: true })
  @ArrayUnique()
  @ArrayMinSize(1)
  @ArrayMaxSize(ROLES.length)
  roles!: Role[];

  @ApiProperty({
    type: String,
    format: 'password',
    minLength: SHORTEST_PASSWORD,
    maxLength: LONGEST_PASSWORD,
  })
  @IsString()
  @MinLength(SHORTEST_PASSWORD)
  @MaxLength(LONGEST_PASSWORD)
  password!: string;
}

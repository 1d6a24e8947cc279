import { ApiProperty } from '@nestjs/swagger';
import { IsString, MaxLength, MinLength } from 'class-validator';
import { LONGEST_PASSWORD } from '../passwords.js';

export class SignInInput {
  @ApiProperty({ type: String, minLength: 1, maxLength: 200 })
  @IsString()
  @MinLength(1)
  @MaxLength(200)
  email!: string;

  @ApiProperty({ type: String, format: 'password', minLength: 1, maxLength: LONGEST_PASSWORD })
  @IsString()
  @MinLength(1)
  @MaxLength(LONGEST_PASSWORD)
  password!: string;
}

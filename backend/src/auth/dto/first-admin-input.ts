import { ApiProperty } from '@nestjs/swagger';
import { IsEmail, IsString, MaxLength, MinLength } from 'class-validator';
import { IsFilled } from '../../common/is-filled.js';
import { LONGEST_PASSWORD, SHORTEST_PASSWORD } from '../passwords.js';

export class FirstAdminInput {
  @ApiProperty({
    type: String,
    minLength: 1,
    maxLength: 200,
    description: 'From the link that the first start prints.',
  })
  @IsString()
  @MinLength(1)
  @MaxLength(200)
  token!: string;

  @ApiProperty({ type: String, minLength: 1, maxLength: 120 })
  @IsFilled()
  @MaxLength(120)
  name!: string;

  @ApiProperty({ type: String, format: 'email', maxLength: 200 })
  @IsEmail()
  @MaxLength(200)
  email!: string;

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

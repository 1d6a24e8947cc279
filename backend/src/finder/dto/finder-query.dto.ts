import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { IsString, MaxLength } from 'class-validator';

/** What a person types into the search of the header. */
@ApiSchema({ name: 'FinderQuery' })
export class FinderQueryDto {
  @ApiProperty({
    type: 'string',
    maxLength: 200,
    description: 'Part of a number, code, title or description',
  })
  @IsString()
  @MaxLength(200)
  text!: string;
}

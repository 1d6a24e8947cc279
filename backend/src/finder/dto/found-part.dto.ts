import { ApiProperty, ApiSchema } from '@nestjs/swagger';

@ApiSchema({ name: 'FoundPart' })
export class FoundPartDto {
  @ApiProperty({ type: 'string' })
  number!: string;

  @ApiProperty({ type: 'string' })
  description!: string;
}

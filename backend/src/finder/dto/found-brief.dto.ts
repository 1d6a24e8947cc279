import { ApiProperty, ApiSchema } from '@nestjs/swagger';

@ApiSchema({ name: 'FoundBrief' })
export class FoundBriefDto {
  @ApiProperty({ type: 'string' })
  id!: string;

  @ApiProperty({ type: 'string' })
  code!: string;

  @ApiProperty({ type: 'string' })
  title!: string;
}

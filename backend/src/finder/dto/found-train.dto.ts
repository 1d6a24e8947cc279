import { ApiProperty, ApiSchema } from '@nestjs/swagger';

@ApiSchema({ name: 'FoundTrain' })
export class FoundTrainDto {
  @ApiProperty({ type: 'string' })
  code!: string;

  @ApiProperty({ type: 'string' })
  title!: string;
}

import { ApiProperty } from '@nestjs/swagger';

export class Health {
  @ApiProperty({ enum: ['ok'] })
  status!: 'ok';
}

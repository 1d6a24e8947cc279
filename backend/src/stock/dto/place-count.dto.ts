import { ApiProperty, ApiSchema } from '@nestjs/swagger';

/** A place that the ledger knows. */
@ApiSchema({ name: 'PlaceCount' })
export class PlaceCountDto {
  @ApiProperty({ type: 'string', example: 'Rack B 3' })
  place!: string;

  @ApiProperty({ type: 'integer', description: 'Parts of which something lies there now' })
  parts!: number;
}

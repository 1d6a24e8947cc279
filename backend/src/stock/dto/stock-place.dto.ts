import { ApiProperty, ApiSchema } from '@nestjs/swagger';

/** What lies of one part at one place. */
@ApiSchema({ name: 'StockPlace' })
export class StockPlaceDto {
  @ApiProperty({ type: 'string', description: 'Rack, shelf, drawer', example: 'Rack B 3' })
  place!: string;

  @ApiProperty({ type: 'number', description: "In the part's unit" })
  quantity!: number;

  @ApiProperty({ type: 'integer', description: 'The latest movement there; a count may name the one it saw' })
  lastMovementId!: number;

  @ApiProperty({ type: 'string', format: 'date-time', nullable: true, description: 'Null: never counted' })
  countedAt!: string | null;
}

import { ApiProperty, ApiSchema } from '@nestjs/swagger';

/** What a supplier offers, counted. Closed offers are left out. */
@ApiSchema({ name: 'SupplierOffers' })
export class SupplierOffersDto {
  @ApiProperty({ type: 'integer', description: 'Open offers that have not ended' })
  open!: number;

  @ApiProperty({ type: 'integer', description: 'Open offers that have ended' })
  expired!: number;

  @ApiProperty({
    type: 'string',
    format: 'date',
    nullable: true,
    description: 'Day of the oldest price among the open offers that have not ended',
  })
  oldestPricedOn!: string | null;
}

import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { OfferDto } from './offer.dto.js';
import { PricedQuantityDto } from './priced-quantity.dto.js';

/** An offer for a part, priced at an asked quantity. */
@ApiSchema({ name: 'PartOffer' })
export class PartOfferDto extends OfferDto {
  @ApiProperty({
    type: PricedQuantityDto,
    nullable: true,
    description: 'Null when the total is too large to be reckoned',
  })
  price!: PricedQuantityDto | null;

  @ApiProperty({
    type: 'integer',
    nullable: true,
    description: 'Calendar days until it arrives; null: not known',
  })
  arrivalDays!: number | null;

  @ApiProperty({ type: 'boolean', description: 'The one that the rule chooses' })
  chosen!: boolean;
}

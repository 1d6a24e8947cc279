import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { PartSummaryDto } from '../../parts/dto/part-summary.dto.js';

/** The best offer for a substitute at the asked quantity. */
@ApiSchema({ name: 'SubstituteOffer' })
export class SubstituteOfferDto {
  @ApiProperty({ type: 'string', description: 'Name of the supplier' })
  supplier!: string;

  @ApiProperty({ type: 'string', description: 'ISO 4217' })
  currency!: string;

  @ApiProperty({ type: 'integer', description: 'Price of what has to be ordered, minor units' })
  lineTotal!: number;

  @ApiProperty({ type: 'number', description: 'What has to be ordered: packs and least quantity counted in' })
  orderQuantity!: number;

  @ApiProperty({ type: 'integer', nullable: true, description: 'Calendar days' })
  leadTimeDays!: number | null;
}

/** A part that drops in. */
@ApiSchema({ name: 'Substitute' })
export class SubstituteDto {
  @ApiProperty({ type: PartSummaryDto })
  part!: PartSummaryDto;

  @ApiProperty({ type: [String], description: 'Where it is not the same, though it fits' })
  differences!: string[];

  @ApiProperty({ type: [String], description: 'What the library cannot tell and a person must look at' })
  toCheck!: string[];

  @ApiProperty({ type: 'boolean', description: 'Named as the part to use instead of the withdrawn one' })
  successor!: boolean;

  @ApiProperty({ type: 'number', nullable: true, description: 'On the shelf; null when it was never booked' })
  onShelf!: number | null;

  @ApiProperty({
    type: SubstituteOfferDto,
    nullable: true,
    description: 'Null: no valid offer, or the person may not see prices',
  })
  offer!: SubstituteOfferDto | null;

  @ApiProperty({
    type: 'integer',
    nullable: true,
    description: 'Calendar days until the quantity is there: 0 when the shelf covers it; null: not known',
  })
  arrivalDays!: number | null;
}

/** Parts that drop in, the soonest there first. */
@ApiSchema({ name: 'Substitutes' })
export class SubstitutesDto {
  @ApiProperty({ type: 'number', description: 'What arrival and price were asked for' })
  quantity!: number;

  @ApiProperty({
    type: [SubstituteDto],
    description: 'By arrival, price and number; those to check come last',
  })
  items!: SubstituteDto[];

  @ApiProperty({ type: 'integer', description: 'Parts that drop in beyond those listed' })
  leftOut!: number;
}

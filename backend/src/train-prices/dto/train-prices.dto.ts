import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { LinePriceDto } from './line-price.dto.js';

/** Why a line has no price. */
export const NO_PRICE_REASONS = ['made', 'no-part', 'no-offers', 'none-valid'] as const;
export type NoPriceReason = (typeof NO_PRICE_REASONS)[number];

/** One line of the bill of materials with its price. */
@ApiSchema({ name: 'TrainPriceLine' })
export class TrainPriceLineDto {
  @ApiProperty({ type: 'string', description: 'Key of the line of the bill of materials' })
  key!: string;

  @ApiProperty({ type: 'integer' })
  findNumber!: number;

  @ApiProperty({ type: 'string', nullable: true })
  partNumber!: string | null;

  @ApiProperty({ type: 'number', description: 'Quantity of the line × build quantity' })
  needed!: number;

  @ApiProperty({ type: 'string', enum: ['pcs', 'l', 'm'] })
  unit!: 'pcs' | 'l' | 'm';

  @ApiProperty({ type: 'number', nullable: true, description: 'Null: it has no place on a shelf' })
  onShelf!: number | null;

  @ApiProperty({ type: LinePriceDto, nullable: true })
  price!: LinePriceDto | null;

  @ApiProperty({ type: 'string', enum: [...NO_PRICE_REASONS, null], nullable: true })
  reason!: NoPriceReason | null;

  @ApiProperty({ type: 'integer', description: 'Further offers that could be used' })
  otherOffers!: number;
}

/** What the lines of one currency cost together. */
@ApiSchema({ name: 'PriceTotal' })
export class PriceTotalDto {
  @ApiProperty({ type: 'string', description: 'ISO 4217' })
  currency!: string;

  @ApiProperty({ type: 'integer', description: 'Minor units' })
  minor!: number;

  @ApiProperty({ type: 'integer', description: 'Lines in the sum' })
  lines!: number;
}

/** A line to be bought that no sum holds. */
@ApiSchema({ name: 'UnpricedLine' })
export class UnpricedLineDto {
  @ApiProperty({ type: 'integer' })
  findNumber!: number;

  @ApiProperty({ type: 'string' })
  key!: string;

  @ApiProperty({ type: 'string', enum: NO_PRICE_REASONS })
  reason!: NoPriceReason;
}

/** An offer that a person chose and that is not used. */
@ApiSchema({ name: 'LostChoice' })
export class LostChoiceDto {
  @ApiProperty({ type: 'string' })
  partNumber!: string;

  @ApiProperty({ type: 'string' })
  offerId!: string;

  @ApiProperty({
    type: 'string',
    nullable: true,
    description: 'Key of the line; null: the part is on no line',
  })
  key!: string | null;

  @ApiProperty({ type: 'string', description: 'What is the matter and what stands in its place' })
  message!: string;
}

/** How much of the need lies on the shelf. */
@ApiSchema({ name: 'ShelfCover' })
export class ShelfCoverDto {
  @ApiProperty({ type: 'integer', description: 'Lines whose whole need lies on the shelf' })
  covered!: number;

  @ApiProperty({ type: 'integer', description: 'Lines with a part of the library' })
  lines!: number;
}

/** What a train costs in a build quantity. */
@ApiSchema({ name: 'TrainPrices' })
export class TrainPricesDto {
  @ApiProperty({ type: 'integer' })
  buildQuantity!: number;

  @ApiProperty({ type: 'string', format: 'date', description: 'The day that offers are held against' })
  on!: string;

  @ApiProperty({
    type: [TrainPriceLineDto],
    description: 'Every line of the bill of materials, in its order',
  })
  lines!: TrainPriceLineDto[];

  @ApiProperty({ type: [PriceTotalDto], description: 'The house currency first; never added to each other' })
  totals!: PriceTotalDto[];

  @ApiProperty({ type: [UnpricedLineDto], description: 'Lines to be bought without a price' })
  unpriced!: UnpricedLineDto[];

  @ApiProperty({ type: [LostChoiceDto], description: 'Offers chosen by a person that are not used' })
  lostChoices!: LostChoiceDto[];

  @ApiProperty({ type: 'string', format: 'date', nullable: true })
  oldestPricedOn!: string | null;

  @ApiProperty({ type: 'integer', description: 'Prices older than the house rule allows' })
  tooOld!: number;

  @ApiProperty({ type: 'integer', nullable: true, description: 'Of the lead times that are known (days)' })
  longestLeadTimeDays!: number | null;

  @ApiProperty({ type: ShelfCoverDto })
  shelf!: ShelfCoverDto;
}

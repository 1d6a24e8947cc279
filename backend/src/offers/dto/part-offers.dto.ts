import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { PART_UNITS, type PartUnit } from '../../parts/part-unit.js';
import { PartOfferDto } from './part-offer.dto.js';

/** Why no offer is chosen. */
export const NO_CHOICE_REASONS = ['no-offers', 'none-valid'] as const;
export type NoChoiceReason = (typeof NO_CHOICE_REASONS)[number];

/** Every offer for a part at an asked quantity: those that can be ordered from first, the best of them first. */
@ApiSchema({ name: 'PartOffers' })
export class PartOffersDto {
  @ApiProperty({ type: 'number' })
  quantity!: number;

  @ApiProperty({ enum: PART_UNITS, enumName: 'PartUnit' })
  unit!: PartUnit;

  @ApiProperty({ type: 'number', nullable: true, description: 'On the shelf; null when it never lay there' })
  onShelf!: number | null;

  @ApiProperty({ type: [PartOfferDto] })
  offers!: PartOfferDto[];

  @ApiProperty({ enum: [...NO_CHOICE_REASONS, null], nullable: true, description: 'Why none is chosen' })
  reason!: NoChoiceReason | null;
}

import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { type OfferState, offerState, priceAge } from '@stageyard/libs/bill-of-materials';
import { HOUSE_RULES } from '../../house-rules/house-rules.js';
import { type Part } from '../../parts/entities/part.entity.js';
import { unitOf } from '../../parts/part-unit.js';
import { type Supplier } from '../../suppliers/entities/supplier.entity.js';
import { type Offer } from '../entities/offer.entity.js';
import {
  OFFER_STANDINGS,
  OFFER_STATES,
  type OfferStanding,
  PRICE_PER,
  type PricePer,
} from '../offer-terms.js';
import { OfferedPartDto } from './offered-part.dto.js';
import { OfferingSupplierDto } from './offering-supplier.dto.js';
import { PriceBreakDto } from './price-break.dto.js';

/** One supplier's price row for a part. Quantities are in the part's unit, prices in minor units of the currency. */
@ApiSchema({ name: 'Offer' })
export class OfferDto {
  @ApiProperty({ type: 'string' })
  id!: string;

  @ApiProperty({ type: OfferedPartDto })
  part!: OfferedPartDto;

  @ApiProperty({ type: OfferingSupplierDto })
  supplier!: OfferingSupplierDto;

  @ApiProperty({ type: 'string', description: "The supplier's own number; blank when it is not known" })
  supplierPartNumber!: string;

  @ApiProperty({ enum: OFFER_STANDINGS, enumName: 'OfferStanding' })
  standing!: OfferStanding;

  @ApiProperty({ enum: OFFER_STATES, enumName: 'OfferState', description: 'Today' })
  state!: OfferState;

  @ApiProperty({ type: 'string', description: 'ISO 4217', example: 'EUR' })
  currency!: string;

  @ApiProperty({ type: 'integer', enum: PRICE_PER, description: 'Prices are for this many' })
  per!: PricePer;

  @ApiProperty({ type: [PriceBreakDto], description: 'The smallest quantity first' })
  breaks!: PriceBreakDto[];

  @ApiProperty({ type: 'number', description: 'Sold in multiples of this' })
  pack!: number;

  @ApiProperty({ type: 'number' })
  leastQuantity!: number;

  @ApiProperty({ type: 'integer', nullable: true, description: 'Calendar days, as the offer states it' })
  leadTimeDays!: number | null;

  @ApiProperty({
    type: 'integer',
    nullable: true,
    description: "Calendar days; the supplier's usual ones where the offer states none",
  })
  effectiveLeadTimeDays!: number | null;

  @ApiProperty({ type: 'string', format: 'date' })
  validFrom!: string;

  @ApiProperty({
    type: 'string',
    format: 'date',
    nullable: true,
    description: 'Last day; null: until further notice',
  })
  validUntil!: string | null;

  @ApiProperty({ type: 'string', format: 'date', description: 'Day on which the supplier stated the price' })
  pricedOn!: string;

  @ApiProperty({ type: 'integer', description: 'Days since the supplier stated the price' })
  ageDays!: number;

  @ApiProperty({ type: 'boolean', description: 'The price is older than the house rule allows' })
  tooOld!: boolean;

  @ApiProperty({ type: 'string' })
  source!: string;

  @ApiProperty({ type: 'string' })
  note!: string;

  @ApiProperty({ type: 'integer', description: 'Send it back with an edit' })
  version!: number;

  @ApiProperty({ type: 'string', format: 'date-time' })
  createdAt!: string;

  @ApiProperty({ type: 'string', format: 'date-time' })
  updatedAt!: string;

  @ApiProperty({ type: 'string', description: 'Name of the person who changed it last' })
  updatedBy!: string;
}

/** An offer with the part and the supplier it belongs to. */
export interface OfferRow {
  offer: Offer;
  part: Part;
  supplier: Supplier;
}

/** What people see of a stored offer. @param today ISO 8601 date, for its state and the age of its price */
export function toOfferDto({ offer, part, supplier }: OfferRow, today: string): OfferDto {
  const ageDays = priceAge(offer.pricedOn, today);
  return {
    id: String(offer.id),
    part: {
      number: part.number,
      description: part.description,
      kind: part.kind,
      standing: part.standing,
      unit: unitOf(part.kind),
    },
    supplier: { code: supplier.code, name: supplier.name, standing: supplier.standing },
    supplierPartNumber: offer.supplierPartNumber,
    standing: offer.standing,
    state: offerState(offer, today, offer.standing),
    currency: offer.currency,
    per: offer.per,
    breaks: offer.breaks,
    pack: offer.pack,
    leastQuantity: offer.leastQuantity,
    leadTimeDays: offer.leadTimeDays,
    effectiveLeadTimeDays: offer.leadTimeDays ?? supplier.leadTimeDays,
    validFrom: offer.validFrom,
    validUntil: offer.validUntil,
    pricedOn: offer.pricedOn,
    ageDays,
    tooOld: ageDays > HOUSE_RULES.priceAgeDays,
    source: offer.source,
    note: offer.note,
    version: offer.version,
    createdAt: offer.createdAt,
    updatedAt: offer.updatedAt,
    updatedBy: offer.updatedBy,
  };
}

import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { type Supplier } from '../entities/supplier.entity.js';
import {
  SUPPLIER_LANGUAGES,
  SUPPLIER_STANDINGS,
  type SupplierLanguage,
  type SupplierStanding,
} from '../supplier-terms.js';
import { FreightRuleDto } from './freight-rule.dto.js';
import { SupplierContactDto } from './supplier-contact.dto.js';
import { SupplierOffersDto } from './supplier-offers.dto.js';

/** A firm that parts are bought from. Amounts are minor units of its currency. */
@ApiSchema({ name: 'Supplier' })
export class SupplierDto {
  @ApiProperty({ type: 'string' })
  id!: string;

  @ApiProperty({ type: 'string', example: 'S-0001' })
  code!: string;

  @ApiProperty({ type: 'string' })
  name!: string;

  @ApiProperty({ enum: SUPPLIER_STANDINGS, enumName: 'SupplierStanding' })
  standing!: SupplierStanding;

  @ApiProperty({ type: 'string', description: 'ISO 4217', example: 'EUR' })
  currency!: string;

  @ApiProperty({ enum: SUPPLIER_LANGUAGES, enumName: 'SupplierLanguage' })
  language!: SupplierLanguage;

  @ApiProperty({ type: [SupplierContactDto] })
  contacts!: SupplierContactDto[];

  @ApiProperty({ type: 'string' })
  address!: string;

  @ApiProperty({ type: FreightRuleDto })
  freight!: FreightRuleDto;

  @ApiProperty({ type: 'integer', nullable: true, description: 'Least value of one order, minor units' })
  leastOrderValue!: number | null;

  @ApiProperty({ type: 'integer', nullable: true, description: 'Usual lead time, calendar days' })
  leadTimeDays!: number | null;

  @ApiProperty({ type: 'string' })
  note!: string;

  @ApiProperty({ type: SupplierOffersDto })
  offers!: SupplierOffersDto;

  @ApiProperty({ type: 'integer', description: 'Send it back with an edit' })
  version!: number;

  @ApiProperty({ type: 'string', format: 'date-time' })
  createdAt!: string;

  @ApiProperty({ type: 'string', format: 'date-time' })
  updatedAt!: string;

  @ApiProperty({ type: 'string', description: 'Name of the person who changed it last' })
  updatedBy!: string;
}

export const NO_OFFERS: SupplierOffersDto = { open: 0, expired: 0, oldestPricedOn: null };

/** What people see of a stored supplier. @param offers counted apart, since offers change by themselves */
export function toSupplierDto(supplier: Supplier, offers: SupplierOffersDto): SupplierDto {
  return {
    id: String(supplier.id),
    code: supplier.code,
    name: supplier.name,
    standing: supplier.standing,
    currency: supplier.currency,
    language: supplier.language,
    contacts: supplier.contacts,
    address: supplier.address,
    freight: supplier.freight,
    leastOrderValue: supplier.leastOrderValue,
    leadTimeDays: supplier.leadTimeDays,
    note: supplier.note,
    offers,
    version: supplier.version,
    createdAt: supplier.createdAt,
    updatedAt: supplier.updatedAt,
    updatedBy: supplier.updatedBy,
  };
}

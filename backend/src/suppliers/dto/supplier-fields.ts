import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { ArrayMaxSize, IsArray, IsObject, ValidateIf, ValidateNested } from 'class-validator';
import { MOST_CONTACTS } from '../supplier-terms.js';
import { FreightRuleDto } from './freight-rule.dto.js';
import { SupplierContactDto } from './supplier-contact.dto.js';

/** The people to send enquiries to, all of them; may be left out. */
export function FieldContacts(): PropertyDecorator {
  return applyDecorators(
    ApiProperty({
      type: [SupplierContactDto],
      required: false,
      maxItems: MOST_CONTACTS,
      description: 'People to send enquiries to',
    }),
    ValidateIf((_, value) => value !== undefined),
    IsArray(),
    ArrayMaxSize(MOST_CONTACTS),
    IsObject({ each: true, message: 'contacts must be a list of objects with name, role, email and phone.' }),
    ValidateNested({ each: true }),
    Type(() => SupplierContactDto),
  );
}

/** The freight rule as a whole; may be left out. */
export function FieldFreight(description: string): PropertyDecorator {
  return applyDecorators(
    ApiProperty({ type: FreightRuleDto, required: false, description }),
    ValidateIf((_, value) => value !== undefined),
    IsObject(),
    ValidateNested(),
    Type(() => FreightRuleDto),
  );
}

import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { OFFER_LIMITS } from '@stageyard/libs/bill-of-materials';
import { Type } from 'class-transformer';
import { ArrayMaxSize, ArrayMinSize, IsArray, IsObject, ValidateIf, ValidateNested } from 'class-validator';
import { FieldFigure } from '../../common/field-figure.decorator.js';
import { PriceBreakDto } from './price-break.dto.js';

/** All price breaks of an offer, ascending. */
export function FieldBreaks({ optional = false } = {}): PropertyDecorator {
  return applyDecorators(
    ApiProperty({
      type: [PriceBreakDto],
      required: !optional,
      minItems: 1,
      maxItems: OFFER_LIMITS.breaks,
      description: 'Price breaks, the smallest quantity first',
    }),
    ValidateIf((_, value) => !optional || value !== undefined),
    IsArray(),
    ArrayMinSize(1),
    ArrayMaxSize(OFFER_LIMITS.breaks),
    IsObject({ each: true, message: 'breaks must be a list of objects with quantity and unitPrice.' }),
    ValidateNested({ each: true }),
    Type(() => PriceBreakDto),
  );
}

/** A quantity in the part's unit that an offer may state. */
export function FieldOfferQuantity(description: string): PropertyDecorator {
  return FieldFigure({ description, min: 0, above: true, max: OFFER_LIMITS.quantity, optional: true });
}

/** A lead time in calendar days; null or left out: the supplier's usual one. */
export function FieldLeadTime(): PropertyDecorator {
  return FieldFigure({
    description: "Lead time, calendar days; null: the supplier's usual one",
    min: 0,
    max: OFFER_LIMITS.leadTimeDays,
    whole: true,
    nullable: true,
  });
}

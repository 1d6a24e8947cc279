import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { currencyDecimals } from '@stageyard/libs/units';
import { Transform } from 'class-transformer';
import { ValidateBy, ValidateIf } from 'class-validator';

/** A currency in a request body by its ISO 4217 code; small letters are taken for capitals. */
export function FieldCurrency(options: { description: string; optional?: boolean }): PropertyDecorator {
  return applyDecorators(
    ApiProperty({
      type: 'string',
      description: `${options.description} (ISO 4217)`,
      minLength: 3,
      maxLength: 3,
      required: !options.optional,
      example: 'EUR',
    }),
    Transform(({ value }: { value: unknown }) =>
      typeof value === 'string' ? value.trim().toUpperCase() : value,
    ),
    ValidateIf((_, value) => !options.optional || value !== undefined),
    ValidateBy({
      name: 'currency',
      constraints: ['ISO 4217'],
      validator: {
        validate: (value) => typeof value === 'string' && currencyDecimals(value) !== undefined,
        defaultMessage: (args) =>
          `${args?.property ?? 'The currency'} must be an ISO 4217 code such as EUR, USD or JPY.`,
      },
    }),
  );
}

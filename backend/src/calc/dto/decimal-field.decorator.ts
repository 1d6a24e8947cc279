import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { Transform } from 'class-transformer';
import { ValidateBy, ValidateIf } from 'class-validator';

/** Longest decimal that the libraries read, characters. */
const LONGEST = 60;

/** A decimal that is kept exact; a number counts as its shortest decimal. What it may say, the library decides. */
export function DecimalField(options: {
  description: string;
  optional?: boolean;
  example?: string;
}): PropertyDecorator {
  return applyDecorators(
    ApiProperty({
      oneOf: [{ type: 'string', maxLength: LONGEST }, { type: 'number' }],
      description: options.description,
      required: !options.optional,
      ...(options.example === undefined ? {} : { example: options.example }),
    }),
    Transform(({ value }: { value: unknown }) => (typeof value === 'number' ? String(value) : value)),
    ValidateIf((_, value) => !options.optional || value !== undefined),
    ValidateBy({
      name: 'decimal',
      constraints: [LONGEST],
      validator: {
        validate: (value) => typeof value === 'string' && value.length <= LONGEST,
        defaultMessage: (args) =>
          `${args?.property ?? 'The figure'} must be a decimal of at most ${LONGEST} characters, such as 37.5.`,
      },
    }),
  );
}

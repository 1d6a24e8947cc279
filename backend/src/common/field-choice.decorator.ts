import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { ValidateBy, ValidateIf } from 'class-validator';

/** How a field with a fixed list of values is described in OpenAPI and checked on the way in. */
export interface ChoiceOptions<T extends string | number> {
  description: string;
  values: readonly T[];
  optional?: boolean;
  nullable?: boolean;
  default?: T;
  /** Schema name, so that screens get one type for the list. */
  enumName?: string;
}

/** One of a fixed list of values in a request body; the refusal states the list. */
export function FieldChoice<T extends string | number>(options: ChoiceOptions<T>): PropertyDecorator {
  const { values } = options;
  const list = values.join(', ');
  return applyDecorators(
    ApiProperty({
      type: typeof values[0] === 'number' ? 'number' : 'string',
      // OpenAPI wants null among the values of a nullable enumeration.
      enum: options.nullable ? [...values, null] : [...values],
      description: options.description,
      required: !options.optional && !options.nullable,
      ...(options.nullable ? { nullable: true } : {}),
      ...(options.default === undefined ? {} : { default: options.default }),
      ...(options.enumName && !options.nullable ? { enumName: options.enumName } : {}),
    }),
    ValidateIf((_, value) =>
      options.nullable
        ? value !== undefined && value !== null
        : options.optional
          ? value !== undefined
          : true,
    ),
    ValidateBy({
      name: 'choice',
      constraints: [list],
      validator: {
        validate: (value) => values.some((allowed) => allowed === value),
        defaultMessage: (args) => `${args?.property ?? 'The field'} must be one of: ${list}.`,
      },
    }),
  );
}

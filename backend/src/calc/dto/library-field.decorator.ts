import { applyDecorators } from '@nestjs/common';
import { ApiProperty, type ApiPropertyOptions } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { Allow, ValidateIf, ValidateNested } from 'class-validator';

/** Bounds as the libraries state them: `min` and `max` are allowed, `above` is not. */
export interface LibraryBounds {
  min?: number;
  above?: number;
  max?: number;
}

interface LibraryFigureOptions {
  description: string;
  unit?: string;
  bounds?: LibraryBounds;
  whole?: boolean;
  optional?: boolean;
  default?: number;
  example?: number;
  values?: readonly number[];
}

/**
 * A number that the library itself checks: here it is only let through and documented, so that bounds and messages
 * stand in one place.
 */
export function LibraryFigure(options: LibraryFigureOptions): PropertyDecorator {
  const { bounds = {}, unit, description } = options;
  return applyDecorators(
    Allow(),
    ApiProperty({
      type: options.whole ? 'integer' : 'number',
      description: unit ? `${description} (${unit})` : description,
      required: !options.optional,
      ...(bounds.min === undefined ? {} : { minimum: bounds.min }),
      ...(bounds.above === undefined ? {} : { minimum: bounds.above, exclusiveMinimum: true }),
      ...(bounds.max === undefined ? {} : { maximum: bounds.max }),
      ...(options.default === undefined ? {} : { default: options.default }),
      ...(options.example === undefined ? {} : { example: options.example }),
      ...(options.values === undefined ? {} : { enum: [...options.values] }),
    }),
  );
}

/** Any other field that the library itself checks. */
export function LibraryField(documentation: ApiPropertyOptions): PropertyDecorator {
  return applyDecorators(Allow(), ApiProperty(documentation));
}

/** A nested object whose unknown fields are refused; whether it must be there, the library decides. */
export function LibraryObject(type: () => new () => object, description: string, required = false) {
  return applyDecorators(
    // The documentation takes a function for a lazy type only when it is called `type`.
    ApiProperty({ type: () => type(), description, required }),
    Type(type),
    ValidateIf((_, value) => typeof value === 'object' && value !== null && !Array.isArray(value)),
    ValidateNested(),
  );
}

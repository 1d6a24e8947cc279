import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { ValidateBy, ValidateIf } from 'class-validator';

/** How a numeric field is described in OpenAPI and checked on the way in. */
export interface FigureOptions {
  /** What the figure means, in a designer's words. */
  description: string;
  /** Unit shown in the documentation and in refusals; left out for counts and coefficients. */
  unit?: string;
  min: number;
  max: number;
  /** Refuses `min` itself: a length must be above 0. */
  above?: boolean;
  whole?: boolean;
  /** The field may be left out; `null` is refused, since that is what NaN becomes in JSON. */
  optional?: boolean;
  /** The field may be `null` or left out, meaning "not known". */
  nullable?: boolean;
  default?: number;
  example?: number;
}

const isFinite = (value: unknown): value is number => typeof value === 'number' && Number.isFinite(value);

/**
 * A bounded number in a request body. Refuses text, NaN, Infinity and figures outside the bounds, with one message
 * that names the field, the bounds and the unit. Exactly one of its three checks fails for any bad value.
 */
export function FieldFigure(options: FigureOptions): PropertyDecorator {
  const { min, max, above = false, whole = false } = options;
  const range = rangeText(options);
  const check = (name: string, limit: number | undefined, passes: (value: unknown) => boolean) =>
    ValidateBy({
      name,
      // The refusal takes the limit it names from here.
      constraints: limit === undefined ? [] : [limit],
      validator: {
        validate: passes,
        defaultMessage: (args) => `${args?.property ?? 'The figure'} must be ${range}.`,
      },
    });
  return applyDecorators(
    ApiProperty({
      type: whole ? 'integer' : 'number',
      description: options.unit ? `${options.description} (${options.unit})` : options.description,
      minimum: min,
      maximum: max,
      ...(above ? { exclusiveMinimum: true } : {}),
      required: !options.optional && !options.nullable,
      ...(options.nullable ? { nullable: true } : {}),
      ...(options.default === undefined ? {} : { default: options.default }),
      ...(options.example === undefined ? {} : { example: options.example }),
    }),
    ValidateIf((_, value) =>
      options.nullable
        ? value !== undefined && value !== null
        : options.optional
          ? value !== undefined
          : true,
    ),
    check('figure', undefined, (value) => isFinite(value) && (!whole || Number.isInteger(value))),
    check('atLeast', min, (value) => !isFinite(value) || (above ? value > min : value >= min)),
    check('atMost', max, (value) => !isFinite(value) || value <= max),
  );
}

function rangeText({ min, max, unit, above, whole }: FigureOptions): string {
  const figure = (value: number) => value.toLocaleString('en-GB', { maximumFractionDigits: 6 });
  const kind = whole ? 'a whole number' : 'a number';
  const bounds = above
    ? `above ${figure(min)} and at most ${figure(max)}`
    : `from ${figure(min)} to ${figure(max)}`;
  return `${kind} ${bounds}${unit ? ` ${unit}` : ''}`;
}

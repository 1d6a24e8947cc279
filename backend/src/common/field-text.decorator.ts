import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { Transform } from 'class-transformer';
import { ValidateBy, ValidateIf } from 'class-validator';

/** How a text field is described in OpenAPI and checked on the way in. */
export interface TextOptions {
  description: string;
  /** Most characters, after blanks at both ends are cut off. */
  max: number;
  /** Least characters; 0 by default. */
  min?: number;
  optional?: boolean;
  nullable?: boolean;
  /** Line breaks and tabs are allowed. */
  multiline?: boolean;
  example?: string;
}

/* eslint-disable no-control-regex -- these expressions exist to find control characters */
const CONTROL = /[\u0000-\u001f\u007f]/;
const CONTROL_BUT_LINES = /[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f]/;
/* eslint-enable no-control-regex */

/** Bounded text in a request body: trimmed, without control characters; one message a bad value. */
export function FieldText(options: TextOptions): PropertyDecorator {
  const { max, min = 0, multiline = false } = options;
  const check = (
    name: string,
    limit: number | undefined,
    message: string,
    passes: (value: unknown) => boolean,
  ) =>
    ValidateBy({
      name,
      // The refusal takes the limit it names from here.
      constraints: limit === undefined ? [] : [limit],
      validator: {
        validate: passes,
        defaultMessage: (args) => `${args?.property ?? 'The text'} ${message}`,
      },
    });
  return applyDecorators(
    ApiProperty({
      type: 'string',
      description: options.description,
      maxLength: max,
      ...(min > 0 ? { minLength: min } : {}),
      required: !options.optional && !options.nullable,
      ...(options.nullable ? { nullable: true } : {}),
      ...(options.example === undefined ? {} : { example: options.example }),
    }),
    Transform(({ value }: { value: unknown }) => (typeof value === 'string' ? value.trim() : value)),
    ValidateIf((_, value) =>
      options.nullable
        ? value !== undefined && value !== null
        : options.optional
          ? value !== undefined
          : true,
    ),
    check('text', undefined, 'must be text.', (value) => typeof value === 'string'),
    check('shortest', min, min === 1 ? 'must not be blank.' : `must have at least ${min} characters.`, (v) =>
      typeof v === 'string' ? v.length >= min : true,
    ),
    check('longest', max, `must have at most ${max.toLocaleString('en-GB')} characters.`, (value) =>
      typeof value === 'string' ? value.length <= max : true,
    ),
    check(
      'plainText',
      undefined,
      multiline
        ? 'must not hold control characters.'
        : 'must not hold control characters or line breaks. Write it on one line.',
      (value) => typeof value !== 'string' || !(multiline ? CONTROL_BUT_LINES : CONTROL).test(value),
    ),
  );
}

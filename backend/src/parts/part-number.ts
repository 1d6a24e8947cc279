import { ApiProperty } from '@nestjs/swagger';
import { applyDecorators } from '@nestjs/common';
import { Transform } from 'class-transformer';
import { ValidateBy, ValidateIf } from 'class-validator';

/** Prefix of the running numbers that the house gives out. */
export const RUNNING_PREFIX = 'KW-';
/** Longest part number, characters. */
export const PART_NUMBER_LENGTH = 40;

const PATTERN = /^[A-Za-z0-9][A-Za-z0-9._-]*$/;
/** Words that are addresses of their own beside `/parts/:number`. */
const RESERVED = new Set(['facets', 'new']);

const RULE =
  'A part number is made of letters A–Z, digits, “-”, “.” and “_”, begins with a letter or a digit, ' +
  `and has at most ${PART_NUMBER_LENGTH} characters. Leave it blank for the next running number.`;

/** `KW-00001`: five digits at least, more when they run out. */
export function runningNumber(count: number): string {
  return `${RUNNING_PREFIX}${String(count).padStart(5, '0')}`;
}

/** Why a number (already trimmed, not blank) is not a part number; null when it is one. */
export function partNumberProblem(number: string): string | null {
  if (RESERVED.has(number.toLowerCase())) {
    return `“${number}” is a word of this program and cannot be a part number. Choose another.`;
  }
  return number.length <= PART_NUMBER_LENGTH && PATTERN.test(number) ? null : RULE;
}

/** A part number in a request body; trimmed. Blank becomes null when the field may be left out. */
export function FieldPartNumber(options: { description: string; optional?: boolean }): PropertyDecorator {
  return applyDecorators(
    ApiProperty({
      type: 'string',
      description: options.description,
      maxLength: PART_NUMBER_LENGTH,
      required: !options.optional,
      ...(options.optional ? { nullable: true } : {}),
      example: 'KW-00417',
    }),
    Transform(({ value }: { value: unknown }) => {
      if (typeof value !== 'string') return value;
      const trimmed = value.trim();
      return trimmed === '' && options.optional ? null : trimmed;
    }),
    ValidateIf((_, value) => !options.optional || (value !== undefined && value !== null)),
    ValidateBy({
      name: 'partNumber',
      constraints: [PART_NUMBER_LENGTH],
      validator: {
        validate: (value) => typeof value === 'string' && partNumberProblem(value) === null,
        defaultMessage: (args) => {
          const value: unknown = args?.value;
          return (typeof value === 'string' ? partNumberProblem(value) : null) ?? RULE;
        },
      },
    }),
  );
}

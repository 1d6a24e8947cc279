import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { PASTE_LIMITS } from '@stageyard/libs/bill-of-materials';
import { ValidateBy } from 'class-validator';

const MOST_PASTED = PASTE_LIMITS.characters;

const BOUNDS = `must be text of 1 to ${MOST_PASTED.toLocaleString('en-GB')} characters. Paste fewer rows at a time.`;

/** Rows as a spreadsheet copies them, kept to the letter: a row may begin with an empty cell, which is a tab. */
export function FieldPastedText(description: string): PropertyDecorator {
  return applyDecorators(
    ApiProperty({ type: 'string', description, minLength: 1, maxLength: MOST_PASTED }),
    ValidateBy({
      name: 'pastedText',
      constraints: [MOST_PASTED],
      validator: {
        validate: (value) =>
          typeof value === 'string' && value.length <= MOST_PASTED && value.trim().length > 0,
        defaultMessage: (args) => `${args?.property ?? 'The text'} ${BOUNDS}`,
      },
    }),
  );
}

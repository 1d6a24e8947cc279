import { applyDecorators } from '@nestjs/common';
import { IsString, Matches } from 'class-validator';

/** A single line of text with at least one character that shows. */
export function IsFilled(): PropertyDecorator {
  return applyDecorators(
    IsString(),
    Matches(/^[^\r\n\t\0]*\S[^\r\n\t\0]*$/, {
      message: '$property must not be empty and must fit on one line.',
    }),
  );
}

import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { isCalendarDate } from '@stageyard/libs/bill-of-materials';
import { Transform } from 'class-transformer';
import { ValidateBy, ValidateIf } from 'class-validator';

/** How a calendar day is described in OpenAPI and checked on the way in. */
export interface DateOptions {
  description: string;
  optional?: boolean;
  nullable?: boolean;
}

const RULE = 'must be a day of the calendar from the year 1900 on, written like 2026-03-31.';

/** A calendar day in a request body, `YYYY-MM-DD`. */
export function FieldDate({ description, optional, nullable }: DateOptions): PropertyDecorator {
  return applyDecorators(
    ApiProperty({
      type: 'string',
      format: 'date',
      description,
      required: !optional && !nullable,
      ...(nullable ? { nullable: true } : {}),
      example: '2026-03-31',
    }),
    Transform(({ value }: { value: unknown }) => (typeof value === 'string' ? value.trim() : value)),
    ValidateIf((_, value) =>
      nullable ? value !== undefined && value !== null : optional ? value !== undefined : true,
    ),
    ValidateBy({
      name: 'calendarDay',
      constraints: ['YYYY-MM-DD'],
      validator: {
        validate: (value) => typeof value === 'string' && isCalendarDate(value),
        defaultMessage: (args) => `${args?.property ?? 'The day'} ${RULE}`,
      },
    }),
  );
}

import { type Type } from '@nestjs/common';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { Transform } from 'class-transformer';
import { IsInt, IsOptional, IsString, Max, MaxLength, Min } from 'class-validator';
import { badInput } from './errors.js';

export const LARGEST_PAGE = 100;
const DEFAULT_SIZE = 25;
const MOST_SORT_KEYS = 2;

/** Reads a number from a query string; anything else stays as it is, for the validator to refuse. */
export function numberFromQuery({ value }: { value: unknown }): unknown {
  const isNumber =
    typeof value === 'string' && /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d{1,3})?$/i.test(value.trim());
  return isNumber ? Number(value) : value;
}

/** Reads `true` or `false` from a query string; anything else stays as it is, for the validator to refuse. */
export function booleanFromQuery({ value }: { value: unknown }): unknown {
  return value === 'true' ? true : value === 'false' ? false : value;
}

/** What every list takes. Resources extend it by their own filters. */
export class ListQueryDto {
  @ApiPropertyOptional({ type: 'integer', minimum: 1, maximum: 1_000_000, default: 1 })
  @IsOptional()
  @Transform(numberFromQuery)
  @IsInt()
  @Min(1)
  @Max(1_000_000)
  page?: number;

  @ApiPropertyOptional({ type: 'integer', minimum: 1, maximum: LARGEST_PAGE, default: DEFAULT_SIZE })
  @IsOptional()
  @Transform(numberFromQuery)
  @IsInt()
  @Min(1)
  @Max(LARGEST_PAGE)
  size?: number;

  @ApiPropertyOptional({ type: String, description: 'At most two fields; a leading minus sorts downwards.' })
  @IsOptional()
  @IsString()
  @MaxLength(100)
  sort?: string;

  @ApiPropertyOptional({ type: String, maxLength: 200 })
  @IsOptional()
  @IsString()
  @MaxLength(200)
  text?: string;
}

export interface SortKey<Field extends string = string> {
  field: Field;
  direction: 'ASC' | 'DESC';
}

/** A list query with every default filled in and the sort keys checked. */
export interface ListQuery<Field extends string = string> {
  page: number;
  size: number;
  skip: number;
  sorts: SortKey<Field>[];
  /** Trimmed; null when nothing was typed. */
  text: string | null;
}

/**
 * Checks the sort keys against what the list can sort by and fills the defaults.
 * @throws ProblemError 400 naming `sort`
 */
export function parseListQuery<Field extends string>(
  query: ListQueryDto,
  allowedSorts: readonly Field[],
): ListQuery<Field> {
  const { page = 1, size = DEFAULT_SIZE } = query;
  return {
    page,
    size,
    skip: (page - 1) * size,
    sorts: parseSorts(query.sort, allowedSorts),
    text: query.text?.trim() || null,
  };
}

function parseSorts<Field extends string>(
  sort: string | undefined,
  allowed: readonly Field[],
): SortKey<Field>[] {
  if (!sort) return [];
  const refuse = (message: string, limit: string | number) =>
    badInput([{ field: 'sort', value: sort, limit, message }]);
  const keys = sort.split(',');
  if (keys.length > MOST_SORT_KEYS)
    throw refuse('A list can be sorted by two fields at most.', MOST_SORT_KEYS);
  const sorts = keys.map((key): SortKey<Field> => {
    const name = key.replace(/^-/, '');
    const field = allowed.find((known) => known === name);
    if (field === undefined) {
      throw refuse(
        `The list cannot be sorted by “${name}”. Use one of: ${allowed.join(', ')}.`,
        allowed.join(', '),
      );
    }
    return { field, direction: key.startsWith('-') ? 'DESC' : 'ASC' };
  });
  if (new Set(sorts.map((key) => key.field)).size < sorts.length) {
    throw refuse('The list is sorted by the same field twice. Name each field once.', MOST_SORT_KEYS);
  }
  return sorts;
}

export interface Page<T> {
  items: T[];
  total: number;
  page: number;
  size: number;
}

/** Base of a list answer's DTO: `class PartPage extends PageOf(Part) {}`. */
export function PageOf<T>(item: Type<T>): Type<Page<T>> {
  class PageBase implements Page<T> {
    @ApiProperty({ type: [item] })
    items!: T[];

    @ApiProperty({ type: 'integer', description: 'How many there are over all pages.' })
    total!: number;

    @ApiProperty({ type: 'integer' })
    page!: number;

    @ApiProperty({ type: 'integer' })
    size!: number;
  }
  return PageBase;
}

/** The answer of a list. */
export function pageOf<T>(
  items: T[],
  total: number,
  { page, size }: { page: number; size: number },
): Page<T> {
  return { items, total, page, size };
}

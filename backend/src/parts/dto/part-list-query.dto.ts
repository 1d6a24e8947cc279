import { applyDecorators } from '@nestjs/common';
import { ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import { Transform } from 'class-transformer';
import { IsBoolean, IsIn, IsNumber, IsOptional, IsString, Max, MaxLength, Min } from 'class-validator';
import { booleanFromQuery, ListQueryDto, numberFromQuery } from '../../common/list-query.js';
import {
  HANDS,
  PART_KINDS,
  PART_STANDINGS,
  type Hand,
  type PartKind,
  type PartStanding,
} from '../part-kinds.js';

const FilterFigure = (description: string): PropertyDecorator =>
  applyDecorators(
    ApiPropertyOptional({ type: 'number', description }),
    IsOptional(),
    Transform(numberFromQuery),
    IsNumber({}, { message: ({ property }) => `${property} must be a number, such as 2 or 1.25.` }),
    Min(0),
    Max(1_000_000),
  );

const FilterChoice = (description: string, values: readonly string[]): PropertyDecorator =>
  applyDecorators(
    ApiPropertyOptional({ enum: values, description }),
    IsOptional(),
    IsIn(values, { message: ({ property }) => `${property} must be one of: ${values.join(', ')}.` }),
  );

const FilterFlag = (description: string): PropertyDecorator =>
  applyDecorators(
    ApiPropertyOptional({ type: 'boolean', description }),
    IsOptional(),
    Transform(booleanFromQuery),
    IsBoolean(),
  );

/** Fields that the list of parts can be sorted by. */
export const PART_SORTS = [
  'number',
  'description',
  'kind',
  'teeth',
  'module',
  'faceWidth',
  'bore',
  'mass',
  'standing',
  'updatedAt',
] as const;
export type PartSort = (typeof PART_SORTS)[number];

/** Filters of the library; every one narrows the list. */
@ApiSchema({ name: 'PartListQuery' })
export class PartListQueryDto extends ListQueryDto {
  @FilterChoice('Kind', PART_KINDS)
  kind?: PartKind;

  @FilterChoice('Standing', PART_STANDINGS)
  standing?: PartStanding;

  @FilterFigure('Least number of teeth')
  teethMin?: number;

  @FilterFigure('Greatest number of teeth')
  teethMax?: number;

  @FilterFigure('Normal module (mm)')
  module?: number;

  @FilterFigure('Normal pressure angle (degrees)')
  pressureAngleDeg?: number;

  @FilterFigure('Helix angle (degrees); 0 finds spur gears')
  helixAngleDeg?: number;

  @FilterChoice('Hand of the helix', HANDS)
  hand?: Hand;

  @ApiPropertyOptional({ type: 'string', maxLength: 100, description: 'Material, whole' })
  @IsOptional()
  @IsString()
  @MaxLength(100)
  material?: string;

  @FilterFigure('Least bore (mm)')
  boreMin?: number;

  @FilterFigure('Greatest bore (mm)')
  boreMax?: number;

  @FilterFigure('Least face width (mm)')
  faceWidthMin?: number;

  @FilterFigure('Greatest face width (mm)')
  faceWidthMax?: number;

  @FilterFlag('Only those of which something lies on the shelf')
  onShelf?: boolean;

  @FilterFlag('Only those below their least stock')
  low?: boolean;
}

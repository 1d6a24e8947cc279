import { applyDecorators } from '@nestjs/common';
import { ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import { IsIn, IsISO8601, IsOptional, IsString, Matches, MaxLength } from 'class-validator';
import { ListQueryDto } from '../../common/list-query.js';
import { MOVEMENT_KINDS, type MovementKind } from '../movement-kinds.js';

const DAY_MESSAGE = '$property must be a day such as 2026-03-31.';

const FilterDay = (description: string): PropertyDecorator =>
  applyDecorators(
    ApiPropertyOptional({ type: 'string', format: 'date', description }),
    IsOptional(),
    Matches(/^\d{4}-\d{2}-\d{2}$/, { message: DAY_MESSAGE }),
    IsISO8601({ strict: true }, { message: DAY_MESSAGE }),
  );

const FilterText = (description: string, most: number): PropertyDecorator =>
  applyDecorators(
    ApiPropertyOptional({ type: 'string', maxLength: most, description }),
    IsOptional(),
    IsString(),
    MaxLength(most),
  );

/** Filters of the movements; `text` looks in part number, description, reason and the person's name. */
@ApiSchema({ name: 'MovementQuery' })
export class MovementQueryDto extends ListQueryDto {
  @FilterText('Part number, whole, whatever its case', 40)
  part?: string;

  @FilterText('Place, whole, whatever its case', 60)
  place?: string;

  @ApiPropertyOptional({ enum: MOVEMENT_KINDS, enumName: 'MovementKind' })
  @IsOptional()
  @IsIn(MOVEMENT_KINDS)
  kind?: MovementKind;

  @FilterDay('First day, where the server stands')
  from?: string;

  @FilterDay('Last day, where the server stands')
  until?: string;
}

import { ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import { Transform } from 'class-transformer';
import { IsBoolean, IsIn, IsOptional, IsString, MaxLength } from 'class-validator';
import { booleanFromQuery, ListQueryDto, PageOf } from '../../common/list-query.js';
import { PART_KINDS, type PartKind } from '../../parts/part-kinds.js';
import { StockItemDto } from './stock-item.dto.js';

/** Fields that the shelf list can be sorted by; `shortBy` is how much is missing to the least stock. */
export const STOCK_SORTS = ['number', 'description', 'quantity', 'leastStock', 'shortBy'] as const;
export type StockSort = (typeof STOCK_SORTS)[number];

/** Filters of the shelf; `text` looks in number and description. */
@ApiSchema({ name: 'StockQuery' })
export class StockQueryDto extends ListQueryDto {
  @ApiPropertyOptional({ type: 'string', maxLength: 60, description: 'Place, whole, whatever its case' })
  @IsOptional()
  @IsString()
  @MaxLength(60)
  place?: string;

  @ApiPropertyOptional({ type: 'boolean', description: 'Only those below their least stock' })
  @IsOptional()
  @Transform(booleanFromQuery)
  @IsBoolean()
  low?: boolean;

  @ApiPropertyOptional({ enum: PART_KINDS, enumName: 'PartKind' })
  @IsOptional()
  @IsIn(PART_KINDS)
  kind?: PartKind;
}

@ApiSchema({ name: 'StockPage' })
export class StockPageDto extends PageOf(StockItemDto) {}

import { ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import { IsIn, IsOptional, IsString, MaxLength } from 'class-validator';
import { ListQueryDto } from '../../common/list-query.js';
import { SUPPLIER_STANDINGS, type SupplierStanding } from '../supplier-terms.js';

/** Fields that the list of suppliers can be sorted by. */
export const SUPPLIER_SORTS = ['code', 'name', 'currency', 'leadTimeDays', 'updatedAt', 'offers'] as const;

/** Filters of the suppliers; the text is looked for in code, name, address, note and contacts. */
@ApiSchema({ name: 'SupplierQuery' })
export class SupplierQueryDto extends ListQueryDto {
  @ApiPropertyOptional({ enum: SUPPLIER_STANDINGS, description: 'Standing' })
  @IsOptional()
  @IsIn(SUPPLIER_STANDINGS, { message: `standing must be one of: ${SUPPLIER_STANDINGS.join(', ')}.` })
  standing?: SupplierStanding;

  @ApiPropertyOptional({ type: 'string', maxLength: 3, description: 'Currency (ISO 4217)' })
  @IsOptional()
  @IsString()
  @MaxLength(3)
  currency?: string;
}

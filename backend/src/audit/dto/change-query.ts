import { ApiPropertyOptional } from '@nestjs/swagger';
import { IsOptional, IsString, MaxLength } from 'class-validator';
import { ListQueryDto } from '../../common/list-query.js';

/** Filters of the record of changes. */
export class ChangeQuery extends ListQueryDto {
  @ApiPropertyOptional({ type: String, maxLength: 40, description: 'Kind of thing, such as part.' })
  @IsOptional()
  @IsString()
  @MaxLength(40)
  entity?: string;

  @ApiPropertyOptional({ type: String, maxLength: 120, description: 'Number, code or id of the thing.' })
  @IsOptional()
  @IsString()
  @MaxLength(120)
  entityId?: string;
}

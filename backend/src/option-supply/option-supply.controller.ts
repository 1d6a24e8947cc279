import { Controller, Get, Param, Query } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Allow } from '../auth/allow.decorator.js';
import { BuildQuantityQueryDto } from '../train-prices/dto/price-query.dto.js';
import { SearchSupplyDto } from './dto/search-supply.dto.js';
import { OptionSupplyService } from './option-supply.service.js';

@ApiTags('Searches')
@Controller('searches')
export class OptionSupplyController {
  constructor(private readonly supply: OptionSupplyService) {}

  @Get(':id/supply')
  @Allow('prices.read')
  @ApiOkResponse({ type: SearchSupplyDto })
  read(@Param('id') id: string, @Query() query: BuildQuantityQueryDto): Promise<SearchSupplyDto> {
    return this.supply.ofSearch(id, query.quantity);
  }
}

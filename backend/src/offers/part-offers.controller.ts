import { Controller, Get, Param, Query } from '@nestjs/common';
import { ApiBadRequestResponse, ApiNotFoundResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Allow } from '../auth/allow.decorator.js';
import { Problem } from '../common/dto/problem.js';
import { PartOffersQueryDto } from './dto/part-offers-query.dto.js';
import { PartOffersDto } from './dto/part-offers.dto.js';
import { PartOffers } from './part-offers.service.js';

@ApiTags('offers')
@Controller('parts/:number/offers')
export class PartOffersController {
  constructor(private readonly offers: PartOffers) {}

  /** Every offer for a part with its price at the asked quantity, the best first. */
  @Get()
  @Allow('prices.read')
  @ApiOkResponse({ type: PartOffersDto })
  @ApiBadRequestResponse({ type: Problem })
  @ApiNotFoundResponse({ type: Problem })
  of(@Param('number') number: string, @Query() query: PartOffersQueryDto): Promise<PartOffersDto> {
    return this.offers.of(number, query);
  }
}

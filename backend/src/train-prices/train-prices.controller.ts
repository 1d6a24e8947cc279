import { Body, Controller, Get, Param, Put, Query } from '@nestjs/common';
import { ApiConflictResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Allow } from '../auth/allow.decorator.js';
import { CurrentUser } from '../auth/current-user.decorator.js';
import { type SignedInUser } from '../auth/signed-in-user.js';
import { Problem } from '../common/dto/problem.js';
import { TrainDto } from '../trains/dto/train.dto.js';
import { BuyingService } from './buying.service.js';
import { BuyingInputDto } from './dto/buying-input.dto.js';
import { PriceQueryDto } from './dto/price-query.dto.js';
import { TrainPricesDto } from './dto/train-prices.dto.js';
import { TrainPricesService } from './train-prices.service.js';

@ApiTags('trains')
@Controller('trains')
export class TrainPricesController {
  constructor(
    private readonly prices: TrainPricesService,
    private readonly buying: BuyingService,
  ) {}

  @Get(':code/prices')
  @Allow('prices.read')
  @ApiOkResponse({ type: TrainPricesDto })
  read(@Param('code') code: string, @Query() query: PriceQueryDto): Promise<TrainPricesDto> {
    return this.prices.ofTrain(code, query);
  }

  @Put(':code/buying')
  @Allow('offers.choose')
  @ApiOkResponse({ type: TrainDto })
  @ApiConflictResponse({ type: Problem, description: 'It changed since; `current` is how it stands now.' })
  choose(
    @Param('code') code: string,
    @Body() input: BuyingInputDto,
    @CurrentUser() user: SignedInUser,
  ): Promise<TrainDto> {
    return this.buying.choose(code, input, user);
  }
}

import { Body, Controller, Get, Param, Patch, Post, Query } from '@nestjs/common';
import {
  ApiBadRequestResponse,
  ApiConflictResponse,
  ApiCreatedResponse,
  ApiNotFoundResponse,
  ApiOkResponse,
  ApiTags,
} from '@nestjs/swagger';
import { type Change, ChangePage } from '../audit/dto/change.js';
import { Allow } from '../auth/allow.decorator.js';
import { CurrentUser, type SignedInUser } from '../auth/current-user.decorator.js';
import { Problem } from '../common/dto/problem.js';
import { ListQueryDto, type Page } from '../common/list-query.js';
import { OfferInputDto } from './dto/offer-input.dto.js';
import { OfferPageDto } from './dto/offer-page.dto.js';
import { OfferPatchDto } from './dto/offer-patch.dto.js';
import { OfferQueryDto } from './dto/offer-query.dto.js';
import { OfferDto } from './dto/offer.dto.js';
import { OfferReader } from './offer-reader.js';
import { OffersService } from './offers.service.js';

@ApiTags('offers')
@Controller('offers')
export class OffersController {
  constructor(
    private readonly reader: OfferReader,
    private readonly offers: OffersService,
  ) {}

  /** One page of the offers, filtered and sorted by the server. */
  @Get()
  @Allow('prices.read')
  @ApiOkResponse({ type: OfferPageDto })
  @ApiBadRequestResponse({ type: Problem })
  list(@Query() query: OfferQueryDto): Promise<Page<OfferDto>> {
    return this.reader.page(query);
  }

  /** One offer. */
  @Get(':id')
  @Allow('prices.read')
  @ApiOkResponse({ type: OfferDto })
  @ApiNotFoundResponse({ type: Problem })
  get(@Param('id') id: string): Promise<OfferDto> {
    return this.reader.get(id);
  }

  /** Who changed what, newest first. */
  @Get(':id/changes')
  @Allow('prices.read')
  @ApiOkResponse({ type: ChangePage })
  @ApiNotFoundResponse({ type: Problem })
  changes(@Param('id') id: string, @Query() query: ListQueryDto): Promise<Page<Change>> {
    return this.reader.changes(id, query);
  }

  /** Adds an offer of a supplier for a part. */
  @Post()
  @Allow('prices.edit')
  @ApiCreatedResponse({ type: OfferDto })
  @ApiBadRequestResponse({ type: Problem })
  @ApiConflictResponse({ type: Problem, description: 'The very same offer is open already.' })
  create(@CurrentUser() user: SignedInUser, @Body() input: OfferInputDto): Promise<OfferDto> {
    return this.offers.create(user, input);
  }

  /** Changes an offer that is still as it was seen. */
  @Patch(':id')
  @Allow('prices.edit')
  @ApiOkResponse({ type: OfferDto })
  @ApiBadRequestResponse({ type: Problem })
  @ApiNotFoundResponse({ type: Problem })
  @ApiConflictResponse({ type: Problem, description: 'Somebody else changed it meanwhile.' })
  update(
    @CurrentUser() user: SignedInUser,
    @Param('id') id: string,
    @Body() patch: OfferPatchDto,
  ): Promise<OfferDto> {
    return this.offers.update(user, id, patch);
  }
}

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
import { PartFacetsDto } from './dto/part-facets.dto.js';
import { PartInputDto } from './dto/part-input.dto.js';
import { PartListQueryDto } from './dto/part-list-query.dto.js';
import { PartPageDto } from './dto/part-page.dto.js';
import { PartPatchDto } from './dto/part-patch.dto.js';
import { type PartSummaryDto } from './dto/part-summary.dto.js';
import { PartDto } from './dto/part.dto.js';
import { PartsReader } from './parts-reader.service.js';
import { PartsService } from './parts.service.js';

@ApiTags('parts')
@Controller('parts')
export class PartsController {
  constructor(
    private readonly reader: PartsReader,
    private readonly parts: PartsService,
  ) {}

  /** One page of the library, filtered and sorted by the server. */
  @Get()
  @Allow('parts.read')
  @ApiOkResponse({ type: PartPageDto })
  @ApiBadRequestResponse({ type: Problem })
  list(@Query() query: PartListQueryDto): Promise<Page<PartSummaryDto>> {
    return this.reader.list(query);
  }

  /** What the library holds, counted for the choices of the filter bar. */
  @Get('facets')
  @Allow('parts.read')
  @ApiOkResponse({ type: PartFacetsDto })
  facets(): Promise<PartFacetsDto> {
    return this.reader.facets();
  }

  /** One part with its computed geometry. */
  @Get(':number')
  @Allow('parts.read')
  @ApiOkResponse({ type: PartDto })
  @ApiNotFoundResponse({ type: Problem })
  get(@Param('number') number: string): Promise<PartDto> {
    return this.reader.get(number);
  }

  /** Who changed what, newest first. */
  @Get(':number/changes')
  @Allow('parts.read')
  @ApiOkResponse({ type: ChangePage })
  @ApiNotFoundResponse({ type: Problem })
  changes(@Param('number') number: string, @Query() query: ListQueryDto): Promise<Page<Change>> {
    return this.reader.changes(number, query);
  }

  /** Adds a part; without a number it gets the next running one. */
  @Post()
  @Allow('parts.edit')
  @ApiCreatedResponse({ type: PartDto })
  @ApiBadRequestResponse({ type: Problem })
  @ApiConflictResponse({ type: Problem, description: 'The number belongs to another part.' })
  create(@CurrentUser() user: SignedInUser, @Body() input: PartInputDto): Promise<PartDto> {
    return this.parts.create(user, input);
  }

  /** Changes a part that is still as it was seen. */
  @Patch(':number')
  @Allow('parts.edit')
  @ApiOkResponse({ type: PartDto })
  @ApiBadRequestResponse({ type: Problem })
  @ApiNotFoundResponse({ type: Problem })
  @ApiConflictResponse({ type: Problem, description: 'Somebody else changed it meanwhile.' })
  update(
    @CurrentUser() user: SignedInUser,
    @Param('number') number: string,
    @Body() patch: PartPatchDto,
  ): Promise<PartDto> {
    return this.parts.update(user, number, patch);
  }
}

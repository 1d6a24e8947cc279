import { Body, Controller, Get, Param, Patch, Post, Query } from '@nestjs/common';
import { ApiConflictResponse, ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { AuditService } from '../audit/audit.service.js';
import { type Change, ChangePage } from '../audit/dto/change.js';
import { Allow } from '../auth/allow.decorator.js';
import { CurrentUser } from '../auth/current-user.decorator.js';
import { type SignedInUser } from '../auth/signed-in-user.js';
import { Problem } from '../common/dto/problem.js';
import { ListQueryDto, type Page } from '../common/list-query.js';
import { BomService } from './bom.service.js';
import { BomDto } from './dto/bom.dto.js';
import { TrainDto } from './dto/train.dto.js';
import { TrainInputDto } from './dto/train-input.dto.js';
import { TrainPatchDto } from './dto/train-patch.dto.js';
import { TrainPageDto, TrainQueryDto } from './dto/train-query.dto.js';
import { type TrainSummaryDto } from './dto/train-summary.dto.js';
import { TrainReader } from './train-reader.js';
import { TrainsService } from './trains.service.js';

@ApiTags('trains')
@Controller('trains')
export class TrainsController {
  constructor(
    private readonly trains: TrainsService,
    private readonly reader: TrainReader,
    private readonly boms: BomService,
    private readonly audit: AuditService,
  ) {}

  @Get()
  @Allow('trains.read')
  @ApiOkResponse({ type: TrainPageDto })
  list(@Query() query: TrainQueryDto, @CurrentUser() user: SignedInUser): Promise<Page<TrainSummaryDto>> {
    return this.reader.page(query, user.id);
  }

  @Post()
  @Allow('trains.edit')
  @ApiCreatedResponse({ type: TrainDto })
  adopt(@Body() input: TrainInputDto, @CurrentUser() user: SignedInUser): Promise<TrainDto> {
    return this.trains.adopt(input, user);
  }

  @Get(':code')
  @Allow('trains.read')
  @ApiOkResponse({ type: TrainDto })
  async get(@Param('code') code: string, @CurrentUser() user: SignedInUser): Promise<TrainDto> {
    const train = await this.reader.get(code);
    // Which offers people chose is for those who may see offers.
    return user.permissions.includes('prices.read') ? train : { ...train, offerChoices: [] };
  }

  @Patch(':code')
  @Allow('trains.edit')
  @ApiOkResponse({ type: TrainDto })
  @ApiConflictResponse({ type: Problem, description: 'It changed since; `current` is how it stands now.' })
  edit(
    @Param('code') code: string,
    @Body() patch: TrainPatchDto,
    @CurrentUser() user: SignedInUser,
  ): Promise<TrainDto> {
    return this.trains.edit(code, patch, user);
  }

  @Get(':code/changes')
  @Allow('trains.read')
  @ApiOkResponse({ type: ChangePage })
  async changes(@Param('code') code: string, @Query() query: ListQueryDto): Promise<Page<Change>> {
    return this.audit.changesOf('train', (await this.reader.get(code)).code, query);
  }

  @Get(':code/bom')
  @Allow('trains.read')
  @ApiOkResponse({ type: BomDto })
  bom(@Param('code') code: string): Promise<BomDto> {
    return this.boms.ofTrain(code);
  }
}

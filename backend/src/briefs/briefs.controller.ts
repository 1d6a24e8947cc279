import { Body, Controller, Delete, Get, Param, Patch, Post, Put, Query } from '@nestjs/common';
import { ApiConflictResponse, ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { AuditService } from '../audit/audit.service.js';
import { type Change, ChangePage } from '../audit/dto/change.js';
import { Allow } from '../auth/allow.decorator.js';
import { CurrentUser } from '../auth/current-user.decorator.js';
import { type SignedInUser } from '../auth/signed-in-user.js';
import { Problem } from '../common/dto/problem.js';
import { ListQueryDto, type Page } from '../common/list-query.js';
import { BriefReader } from './brief-reader.js';
import { BriefsService } from './briefs.service.js';
import { BriefDto } from './dto/brief.dto.js';
import { BriefInputDto } from './dto/brief-input.dto.js';
import { BriefPatchDto } from './dto/brief-patch.dto.js';
import { BriefPageDto, BriefQueryDto } from './dto/brief-query.dto.js';
import { type BriefSummaryDto } from './dto/brief-summary.dto.js';
import { PinInputDto } from './dto/pin-input.dto.js';
import { PinsService } from './pins.service.js';

@ApiTags('briefs')
@Controller('briefs')
export class BriefsController {
  constructor(
    private readonly briefs: BriefsService,
    private readonly reader: BriefReader,
    private readonly pins: PinsService,
    private readonly audit: AuditService,
  ) {}

  @Get()
  @Allow('briefs.read')
  @ApiOkResponse({ type: BriefPageDto })
  list(@Query() query: BriefQueryDto, @CurrentUser() user: SignedInUser): Promise<Page<BriefSummaryDto>> {
    return this.reader.page(query, user.id);
  }

  @Post()
  @Allow('briefs.edit')
  @ApiCreatedResponse({ type: BriefDto })
  create(@Body() input: BriefInputDto, @CurrentUser() user: SignedInUser): Promise<BriefDto> {
    return this.briefs.create(input, user);
  }

  @Get(':id')
  @Allow('briefs.read')
  @ApiOkResponse({ type: BriefDto })
  get(@Param('id') id: string): Promise<BriefDto> {
    return this.reader.get(id);
  }

  @Patch(':id')
  @Allow('briefs.edit')
  @ApiOkResponse({ type: BriefDto })
  @ApiConflictResponse({ type: Problem, description: 'It changed since; `current` is how it stands now.' })
  edit(
    @Param('id') id: string,
    @Body() patch: BriefPatchDto,
    @CurrentUser() user: SignedInUser,
  ): Promise<BriefDto> {
    return this.briefs.edit(id, patch, user);
  }

  @Get(':id/changes')
  @Allow('briefs.read')
  @ApiOkResponse({ type: ChangePage })
  async changes(@Param('id') id: string, @Query() query: ListQueryDto): Promise<Page<Change>> {
    return this.audit.changesOf('brief', (await this.reader.get(id)).code, query);
  }

  @Put(':id/pins/:optionKey')
  @Allow('briefs.edit')
  @ApiOkResponse({ type: BriefDto })
  @ApiConflictResponse({ type: Problem, description: 'As many as there can be are pinned.' })
  pin(
    @Param('id') id: string,
    @Param('optionKey') optionKey: string,
    @Body() { searchId }: PinInputDto,
    @CurrentUser() user: SignedInUser,
  ): Promise<BriefDto> {
    return this.pins.pin(id, optionKey, searchId, user);
  }

  @Delete(':id/pins/:optionKey')
  @Allow('briefs.edit')
  @ApiOkResponse({ type: BriefDto })
  unpin(
    @Param('id') id: string,
    @Param('optionKey') optionKey: string,
    @CurrentUser() user: SignedInUser,
  ): Promise<BriefDto> {
    return this.pins.unpin(id, optionKey, user);
  }
}

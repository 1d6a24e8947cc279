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
import { SupplierInputDto } from './dto/supplier-input.dto.js';
import { SupplierPageDto } from './dto/supplier-page.dto.js';
import { SupplierPatchDto } from './dto/supplier-patch.dto.js';
import { SupplierQueryDto } from './dto/supplier-query.dto.js';
import { SupplierDto } from './dto/supplier.dto.js';
import { SupplierReader } from './supplier-reader.js';
import { SuppliersService } from './suppliers.service.js';

@ApiTags('suppliers')
@Controller('suppliers')
export class SuppliersController {
  constructor(
    private readonly reader: SupplierReader,
    private readonly suppliers: SuppliersService,
  ) {}

  /** One page of the suppliers, with their offers counted. */
  @Get()
  @Allow('prices.read')
  @ApiOkResponse({ type: SupplierPageDto })
  @ApiBadRequestResponse({ type: Problem })
  list(@Query() query: SupplierQueryDto): Promise<Page<SupplierDto>> {
    return this.reader.page(query);
  }

  /** One supplier. */
  @Get(':code')
  @Allow('prices.read')
  @ApiOkResponse({ type: SupplierDto })
  @ApiNotFoundResponse({ type: Problem })
  get(@Param('code') code: string): Promise<SupplierDto> {
    return this.reader.get(code);
  }

  /** Who changed what, newest first. */
  @Get(':code/changes')
  @Allow('prices.read')
  @ApiOkResponse({ type: ChangePage })
  @ApiNotFoundResponse({ type: Problem })
  changes(@Param('code') code: string, @Query() query: ListQueryDto): Promise<Page<Change>> {
    return this.reader.changes(code, query);
  }

  /** Adds a supplier, which gets the next code. */
  @Post()
  @Allow('prices.edit')
  @ApiCreatedResponse({ type: SupplierDto })
  @ApiBadRequestResponse({ type: Problem })
  @ApiConflictResponse({ type: Problem, description: 'The name belongs to another supplier.' })
  create(@CurrentUser() user: SignedInUser, @Body() input: SupplierInputDto): Promise<SupplierDto> {
    return this.suppliers.create(user, input);
  }

  /** Changes a supplier that is still as it was seen. Offers that are there keep their currency. */
  @Patch(':code')
  @Allow('prices.edit')
  @ApiOkResponse({ type: SupplierDto })
  @ApiBadRequestResponse({ type: Problem })
  @ApiNotFoundResponse({ type: Problem })
  @ApiConflictResponse({ type: Problem, description: 'Somebody else changed it meanwhile, or has the name.' })
  update(
    @CurrentUser() user: SignedInUser,
    @Param('code') code: string,
    @Body() patch: SupplierPatchDto,
  ): Promise<SupplierDto> {
    return this.suppliers.update(user, code, patch);
  }
}

import { Body, Controller, Get, Param, Post, Put, Query, Res } from '@nestjs/common';
import {
  ApiBadRequestResponse,
  ApiConflictResponse,
  ApiCreatedResponse,
  ApiNotFoundResponse,
  ApiOkResponse,
  ApiTags,
} from '@nestjs/swagger';
import type { FastifyReply } from 'fastify';
import { Allow } from '../auth/allow.decorator.js';
import { CurrentUser, type SignedInUser } from '../auth/current-user.decorator.js';
import { Problem } from '../common/dto/problem.js';
import type { Page } from '../common/list-query.js';
import { LeastStockInputDto } from './dto/least-stock-input.dto.js';
import { MovementInputDto } from './dto/movement-input.dto.js';
import { MovementQueryDto } from './dto/movement-query.dto.js';
import { MovementDto, MovementPageDto } from './dto/movement.dto.js';
import { PlaceCountDto } from './dto/place-count.dto.js';
import { StockItemDto } from './dto/stock-item.dto.js';
import { StockPageDto, StockQueryDto } from './dto/stock-query.dto.js';
import { MovementsReader } from './movements-reader.service.js';
import { StockReader } from './stock-reader.service.js';
import { StockService } from './stock.service.js';

@ApiTags('stock')
@Controller('stock')
export class StockController {
  constructor(
    private readonly reader: StockReader,
    private readonly movementsReader: MovementsReader,
    private readonly stock: StockService,
  ) {}

  /** Parts that lay on a shelf or are watched; `low=true` is the low-stock list. */
  @Get()
  @Allow('stock.read')
  @ApiOkResponse({ type: StockPageDto })
  @ApiBadRequestResponse({ type: Problem })
  list(@Query() query: StockQueryDto): Promise<Page<StockItemDto>> {
    return this.reader.list(query);
  }

  /** Every place that the ledger knows, for choices. */
  @Get('places')
  @Allow('stock.read')
  @ApiOkResponse({ type: [PlaceCountDto] })
  places(): Promise<PlaceCountDto[]> {
    return this.reader.places();
  }

  /** The ledger, newest first. */
  @Get('movements')
  @Allow('stock.read')
  @ApiOkResponse({ type: MovementPageDto })
  @ApiBadRequestResponse({ type: Problem })
  movements(@Query() query: MovementQueryDto): Promise<Page<MovementDto>> {
    return this.movementsReader.list(query);
  }

  /** The shelf of one part; any part of the library has one, empty or not. */
  @Get('items/:number')
  @Allow('stock.read')
  @ApiOkResponse({ type: StockItemDto })
  @ApiNotFoundResponse({ type: Problem })
  item(@Param('number') number: string): Promise<StockItemDto> {
    return this.reader.item(number);
  }

  /** Books a movement. Sent again with the same `requestKey` it books nothing and answers 200 with the first one. */
  @Post('movements')
  @Allow('stock.book')
  @ApiCreatedResponse({ type: MovementDto })
  @ApiOkResponse({ type: MovementDto, description: 'It had been booked before.' })
  @ApiBadRequestResponse({ type: Problem })
  @ApiNotFoundResponse({ type: Problem })
  @ApiConflictResponse({
    type: Problem,
    description:
      'not-enough-there, too-much-there, or changed-meanwhile: `current` is the shelf as it stands. ' +
      'request-key-used: the key belongs to another movement.',
  })
  async book(
    @CurrentUser() user: SignedInUser,
    @Body() input: MovementInputDto,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<MovementDto> {
    const { movement, isNew } = await this.stock.book(user, input);
    void reply.status(isNew ? 201 : 200);
    return movement;
  }

  /** Says from when on the shelf of a part counts as low. */
  @Put('items/:number/least')
  @Allow('stock.book')
  @ApiOkResponse({ type: StockItemDto })
  @ApiBadRequestResponse({ type: Problem })
  @ApiNotFoundResponse({ type: Problem })
  @ApiConflictResponse({ type: Problem, description: 'Somebody else changed the part meanwhile.' })
  setLeast(
    @CurrentUser() user: SignedInUser,
    @Param('number') number: string,
    @Body() input: LeastStockInputDto,
  ): Promise<StockItemDto> {
    return this.stock.setLeast(user, number, input);
  }
}

import { Body, Controller, Get, HttpCode, Param, Post, Put, Query } from '@nestjs/common';
import { ApiBadRequestResponse, ApiConflictResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Allow } from '../../auth/allow.decorator.js';
import { CurrentUser, type SignedInUser } from '../../auth/current-user.decorator.js';
import { Problem } from '../../common/dto/problem.js';
import { SubstitutesDto } from '../../substitutes/dto/substitutes.dto.js';
import { TrainDto } from '../dto/train.dto.js';
import { BomPaste } from './bom-paste.service.js';
import { BomPasteBookedDto, BomPastePreviewDto } from './dto/bom-paste.dto.js';
import { BomPasteBookInputDto, BomPasteInputDto } from './dto/bom-paste-input.dto.js';
import { ExtraLinesInputDto } from './dto/extra-lines.dto.js';
import { LineSubstitutesQueryDto } from './dto/line-substitutes-query.dto.js';
import { SwapInputDto } from './dto/swap-input.dto.js';
import { SwapResultDto } from './dto/swap-result.dto.js';
import { ExtraLines } from './extra-lines.service.js';
import { LineSubstitutes } from './line-substitutes.service.js';
import { Swaps } from './swaps.service.js';

const CHANGED = 'It changed since; `current` is how it stands now.';

/** What people change on a bill of materials. */
@ApiTags('trains')
@Controller('trains')
export class BomEditsController {
  constructor(
    private readonly lineSubstitutes: LineSubstitutes,
    private readonly swaps: Swaps,
    private readonly extraLines: ExtraLines,
    private readonly paste: BomPaste,
  ) {}

  /** Parts that drop in on a line; prices only for people who may see them. */
  @Get(':code/substitutes')
  @Allow('trains.read')
  @ApiOkResponse({ type: SubstitutesDto })
  @ApiBadRequestResponse({ type: Problem })
  substitutes(
    @Param('code') code: string,
    @Query() { key, quantity }: LineSubstitutesQueryDto,
    @CurrentUser() user: SignedInUser,
  ): Promise<SubstitutesDto> {
    return this.lineSubstitutes.of(code, key, quantity, user);
  }

  /** Takes another part for a line, or only says what that would change. */
  @Post(':code/swaps')
  @HttpCode(200)
  @Allow('trains.edit')
  @ApiOkResponse({ type: SwapResultDto })
  @ApiBadRequestResponse({ type: Problem })
  @ApiConflictResponse({ type: Problem, description: CHANGED })
  swap(
    @Param('code') code: string,
    @Body() input: SwapInputDto,
    @CurrentUser() user: SignedInUser,
  ): Promise<SwapResultDto> {
    return this.swaps.swap(code, input, user);
  }

  /** Puts the given lines in the place of all added lines. */
  @Put(':code/extra-lines')
  @Allow('trains.edit')
  @ApiOkResponse({ type: TrainDto })
  @ApiBadRequestResponse({ type: Problem })
  @ApiConflictResponse({ type: Problem, description: CHANGED })
  setExtraLines(
    @Param('code') code: string,
    @Body() input: ExtraLinesInputDto,
    @CurrentUser() user: SignedInUser,
  ): Promise<TrainDto> {
    return this.extraLines.set(code, input, user);
  }

  /** Says what pasted rows would do; nothing is booked. */
  @Post(':code/bom-paste')
  @HttpCode(200)
  @Allow('trains.edit')
  @ApiOkResponse({ type: BomPastePreviewDto })
  @ApiBadRequestResponse({ type: Problem })
  previewPaste(@Param('code') code: string, @Body() { text }: BomPasteInputDto): Promise<BomPastePreviewDto> {
    return this.paste.preview(code, text);
  }

  /** Books the rows as they were previewed, all in one go. */
  @Post(':code/bom-paste/book')
  @HttpCode(200)
  @Allow('trains.edit')
  @ApiOkResponse({ type: BomPasteBookedDto })
  @ApiBadRequestResponse({ type: Problem })
  @ApiConflictResponse({
    type: Problem,
    description: 'preview-outdated: `current` is the new preview; changed-meanwhile: it is the train.',
  })
  bookPaste(
    @Param('code') code: string,
    @Body() input: BomPasteBookInputDto,
    @CurrentUser() user: SignedInUser,
  ): Promise<BomPasteBookedDto> {
    return this.paste.book(code, input, user);
  }
}

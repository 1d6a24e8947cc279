import { Body, Controller, HttpCode, Post } from '@nestjs/common';
import {
  ApiBadRequestResponse,
  ApiConflictResponse,
  ApiNotFoundResponse,
  ApiOkResponse,
  ApiTags,
} from '@nestjs/swagger';
import { Allow } from '../../auth/allow.decorator.js';
import { CurrentUser, type SignedInUser } from '../../auth/current-user.decorator.js';
import { Problem } from '../../common/dto/problem.js';
import { OfferPasteBookInputDto, OfferPasteInputDto } from './dto/offer-paste-input.dto.js';
import { OfferPasteBookedDto, OfferPastePreviewDto } from './dto/offer-paste-preview.dto.js';
import { OfferPaste } from './offer-paste.service.js';

@ApiTags('offers')
@Controller('offers/paste')
export class OfferPasteController {
  constructor(private readonly paste: OfferPaste) {}

  /** What pasted rows of a price list would do; nothing is booked. */
  @Post()
  @HttpCode(200)
  @Allow('prices.edit')
  @ApiOkResponse({ type: OfferPastePreviewDto })
  @ApiBadRequestResponse({ type: Problem })
  @ApiNotFoundResponse({ type: Problem })
  preview(@Body() input: OfferPasteInputDto): Promise<OfferPastePreviewDto> {
    return this.paste.preview(input);
  }

  /** Books what the preview said: all of it, or nothing. */
  @Post('book')
  @HttpCode(200)
  @Allow('prices.edit')
  @ApiOkResponse({ type: OfferPasteBookedDto })
  @ApiBadRequestResponse({ type: Problem })
  @ApiNotFoundResponse({ type: Problem })
  @ApiConflictResponse({ type: Problem, description: 'The rows would now do something else.' })
  book(
    @CurrentUser() user: SignedInUser,
    @Body() input: OfferPasteBookInputDto,
  ): Promise<OfferPasteBookedDto> {
    return this.paste.book(user, input);
  }
}

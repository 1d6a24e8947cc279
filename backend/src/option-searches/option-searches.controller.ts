import { Controller, Get, HttpCode, type MessageEvent, Param, Post, Sse } from '@nestjs/common';
import {
  ApiAcceptedResponse,
  ApiConflictResponse,
  ApiCreatedResponse,
  ApiOkResponse,
  ApiTags,
} from '@nestjs/swagger';
import { type Observable, takeUntil } from 'rxjs';
import { Allow } from '../auth/allow.decorator.js';
import { CurrentUser } from '../auth/current-user.decorator.js';
import { SessionsService } from '../auth/sessions.service.js';
import { type SignedInUser } from '../auth/signed-in-user.js';
import { Problem } from '../common/dto/problem.js';
import { SearchDto } from './dto/search.dto.js';
import { SearchSummaryDto } from './dto/search-summary.dto.js';
import { OptionSearchesService } from './option-searches.service.js';

@ApiTags('Searches')
@Controller()
export class OptionSearchesController {
  constructor(
    private readonly searches: OptionSearchesService,
    private readonly sessions: SessionsService,
  ) {}

  @Post('briefs/:id/searches')
  @Allow('briefs.edit')
  @ApiCreatedResponse({ type: SearchDto })
  @ApiConflictResponse({ type: Problem, description: 'A search of the same person still runs.' })
  start(@Param('id') id: string, @CurrentUser() user: SignedInUser): Promise<SearchDto> {
    return this.searches.start(id, user);
  }

  @Get('briefs/:id/searches')
  @Allow('briefs.read')
  @ApiOkResponse({ type: [SearchSummaryDto] })
  ofBrief(@Param('id') id: string): Promise<SearchSummaryDto[]> {
    return this.searches.ofBrief(id);
  }

  @Get('searches/:id')
  @Allow('briefs.read')
  @ApiOkResponse({ type: SearchDto })
  get(@Param('id') id: string): Promise<SearchDto> {
    return this.searches.get(id);
  }

  @Sse('searches/:id/events')
  @Allow('briefs.read')
  @ApiOkResponse({
    description:
      'Events `state` (a SearchSummary) and `progress` (a SearchProgress); ends when the search has ended',
    content: { 'text/event-stream': { schema: { type: 'string' } } },
  })
  async events(
    @Param('id') id: string,
    @CurrentUser() user: SignedInUser,
  ): Promise<Observable<MessageEvent>> {
    return (await this.searches.events(id)).pipe(takeUntil(this.sessions.ending(user)));
  }

  @Post('searches/:id/stop')
  @HttpCode(202)
  @Allow('briefs.edit')
  @ApiAcceptedResponse({ type: SearchDto })
  stop(@Param('id') id: string, @CurrentUser() user: SignedInUser): Promise<SearchDto> {
    return this.searches.stop(id, user);
  }
}

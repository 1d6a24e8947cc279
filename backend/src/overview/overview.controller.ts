import { Controller, Get } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { SignedIn } from '../auth/allow.decorator.js';
import { CurrentUser, type SignedInUser } from '../auth/current-user.decorator.js';
import { OverviewDto } from './dto/overview.dto.js';
import { OverviewService } from './overview.service.js';

@ApiTags('overview')
@Controller('overview')
export class OverviewController {
  constructor(private readonly overview: OverviewService) {}

  /** Counts, and what the person was working on. */
  @Get()
  @SignedIn()
  @ApiOkResponse({ type: OverviewDto })
  read(@CurrentUser() user: SignedInUser): Promise<OverviewDto> {
    return this.overview.of(user);
  }
}

import { Controller, Get, Query } from '@nestjs/common';
import { ApiBadRequestResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { SignedIn } from '../auth/allow.decorator.js';
import { CurrentUser, type SignedInUser } from '../auth/current-user.decorator.js';
import { Problem } from '../common/dto/problem.js';
import { FinderQueryDto } from './dto/finder-query.dto.js';
import { FinderResultDto } from './dto/finder-result.dto.js';
import { FinderService } from './finder.service.js';

@ApiTags('finder')
@Controller('finder')
export class FinderController {
  constructor(private readonly finder: FinderService) {}

  /** Parts, briefs, trains and suppliers whose number, code, title, name or description holds the text. */
  @Get()
  @SignedIn()
  @ApiOkResponse({ type: FinderResultDto })
  @ApiBadRequestResponse({ type: Problem })
  find(@CurrentUser() user: SignedInUser, @Query() { text }: FinderQueryDto): Promise<FinderResultDto> {
    return this.finder.find(user, text);
  }
}

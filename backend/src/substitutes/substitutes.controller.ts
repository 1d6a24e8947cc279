import { Controller, Get, Param, Query } from '@nestjs/common';
import { ApiBadRequestResponse, ApiNotFoundResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Allow } from '../auth/allow.decorator.js';
import { CurrentUser, type SignedInUser } from '../auth/current-user.decorator.js';
import { Problem } from '../common/dto/problem.js';
import { SubstitutesDto } from './dto/substitutes.dto.js';
import { SubstitutesQueryDto } from './dto/substitutes-query.dto.js';
import { Substitutes } from './substitutes.service.js';

@ApiTags('parts')
@Controller('parts')
export class SubstitutesController {
  constructor(private readonly substitutes: Substitutes) {}

  /** Parts that drop in for this one; prices only for people who may see them. */
  @Get(':number/substitutes')
  @Allow('parts.read')
  @ApiOkResponse({ type: SubstitutesDto })
  @ApiBadRequestResponse({ type: Problem })
  @ApiNotFoundResponse({ type: Problem })
  ofPart(
    @Param('number') number: string,
    @Query() { quantity = 1 }: SubstitutesQueryDto,
    @CurrentUser() user: SignedInUser,
  ): Promise<SubstitutesDto> {
    return this.substitutes.ofPart(number, quantity, user);
  }
}

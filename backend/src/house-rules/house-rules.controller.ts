import { Controller, Get } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Allow } from '../auth/allow.decorator.js';
import { HouseRules } from './dto/house-rules.js';
import { HOUSE_RULES } from './house-rules.js';

@ApiTags('house rules')
@Controller('house-rules')
export class HouseRulesController {
  /** The limits that every check uses. */
  @Get()
  @Allow('rules.read')
  @ApiOkResponse({ type: HouseRules })
  read(): HouseRules {
    return HOUSE_RULES;
  }
}

import { Controller, Get, Query } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Allow } from '../auth/allow.decorator.js';
import { CurrentUser, type SignedInUser } from '../auth/current-user.decorator.js';
import { type Page } from '../common/list-query.js';
import { AuditService } from './audit.service.js';
import { type Change, ChangePage } from './dto/change.js';
import { ChangeQuery } from './dto/change-query.js';

@ApiTags('audit')
@Controller('audit')
export class AuditController {
  constructor(private readonly audit: AuditService) {}

  /** Every change, newest first; accounts and sign-ins only for those who manage people, suppliers and offers only for those who read prices. */
  @Get()
  @Allow('audit.read')
  @ApiOkResponse({ type: ChangePage })
  list(@Query() query: ChangeQuery, @CurrentUser() user: SignedInUser): Promise<Page<Change>> {
    return this.audit.visibleTo(user, query);
  }
}

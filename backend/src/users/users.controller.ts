import { Body, Controller, Get, Param, Patch, Post, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Allow } from '../auth/allow.decorator.js';
import { CurrentUser, type SignedInUser } from '../auth/current-user.decorator.js';
import { ListQueryDto, type Page } from '../common/list-query.js';
import { User, UserPage } from './dto/user.js';
import { UserInput } from './dto/user-input.js';
import { UserPatch } from './dto/user-patch.js';
import { UsersService } from './users.service.js';

@ApiTags('users')
@Controller('users')
@Allow('people.manage')
export class UsersController {
  constructor(private readonly users: UsersService) {}

  @Get()
  @ApiOkResponse({ type: UserPage })
  list(@Query() query: ListQueryDto): Promise<Page<User>> {
    return this.users.list(query);
  }

  @Post()
  @ApiCreatedResponse({ type: User })
  create(@Body() input: UserInput, @CurrentUser() actor: SignedInUser): Promise<User> {
    return this.users.create(input, actor);
  }

  @Patch(':id')
  @ApiOkResponse({ type: User })
  change(
    @Param('id') id: string,
    @Body() patch: UserPatch,
    @CurrentUser() actor: SignedInUser,
  ): Promise<User> {
    return this.users.change(id, patch, actor);
  }
}

import { Body, Controller, Get, HttpCode, Inject, Post, Req, Res, UseGuards } from '@nestjs/common';
import { ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { ThrottlerGuard } from '@nestjs/throttler';
import { type FastifyReply, type FastifyRequest } from 'fastify';
import { SETTINGS, type Settings } from '../settings/settings.js';
import { Public, SignedIn } from './allow.decorator.js';
import { type Arrival, AuthService } from './auth.service.js';
import { CurrentUser, type SignedInUser } from './current-user.decorator.js';
import { FirstAdminInput } from './dto/first-admin-input.js';
import { Me, toMe } from './dto/me.js';
import { SignInInput } from './dto/sign-in-input.js';
import { Welcome } from './dto/welcome.js';
import { clearSessionCookie, setSessionCookie } from './session-cookie.js';
import { LIFETIME_MS } from './sessions.service.js';

@ApiTags('auth')
@Controller('auth')
export class AuthController {
  constructor(
    private readonly auth: AuthService,
    @Inject(SETTINGS) private readonly settings: Settings,
  ) {}

  /** What the sign-in page shows. */
  @Get('welcome')
  @Public()
  @ApiOkResponse({ type: Welcome })
  welcome(): Welcome {
    return this.auth.welcome();
  }

  /** Starts a session and sets its cookie. */
  @Post('sign-in')
  @Public()
  @UseGuards(ThrottlerGuard)
  @HttpCode(200)
  @ApiOkResponse({ type: Me })
  async signIn(
    @Body() input: SignInInput,
    @Req() request: FastifyRequest,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<Me> {
    return this.welcomeIn(await this.auth.signIn(input, request.ip), reply);
  }

  /** Makes the first administrator from the link that the first start prints. */
  @Post('first-admin')
  @Public()
  @UseGuards(ThrottlerGuard)
  @HttpCode(200)
  @ApiOkResponse({ type: Me })
  async firstAdmin(
    @Body() input: FirstAdminInput,
    @Req() request: FastifyRequest,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<Me> {
    return this.welcomeIn(await this.auth.firstAdmin(input, request.ip), reply);
  }

  /** Ends the session. */
  @Post('sign-out')
  @SignedIn()
  @HttpCode(204)
  @ApiNoContentResponse()
  async signOut(
    @CurrentUser() person: SignedInUser,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<void> {
    await this.auth.signOut(person);
    clearSessionCookie(reply, this.settings);
  }

  /** The person who is signed in. */
  @Get('me')
  @SignedIn()
  @ApiOkResponse({ type: Me })
  me(@CurrentUser() person: SignedInUser): Me {
    return toMe(person);
  }

  private welcomeIn({ person, cookie }: Arrival, reply: FastifyReply): Me {
    setSessionCookie(reply, this.settings, cookie, LIFETIME_MS / 1000);
    return toMe(person);
  }
}

import { Global, Module, type OnModuleInit } from '@nestjs/common';
import { APP_GUARD, DiscoveryModule, DiscoveryService, MetadataScanner, Reflector } from '@nestjs/core';
import { ThrottlerModule } from '@nestjs/throttler';
import { TypeOrmModule } from '@nestjs/typeorm';
import { UserEntity } from '../users/entities/user.entity.js';
import { UsersModule } from '../users/users.module.js';
import { AccessGuard } from './access.guard.js';
import { AuthController } from './auth.controller.js';
import { AuthService } from './auth.service.js';
import { assertDeclaredAccess } from './declared-access.js';
import { InvitationsService } from './invitations.service.js';
import { OpeningService } from './opening.service.js';
import { SessionsModule } from './sessions.module.js';
import { SignInThrottle } from './sign-in-throttle.js';

/** Hashing is costly: even right attempts are limited, though a test suite or a shared office never gets there. */
const MOST_SIGN_INS = { ttl: 60_000, limit: 200 };

@Global()
@Module({
  imports: [
    DiscoveryModule,
    SessionsModule,
    UsersModule,
    ThrottlerModule.forRoot([MOST_SIGN_INS]),
    TypeOrmModule.forFeature([UserEntity]),
  ],
  controllers: [AuthController],
  providers: [
    AuthService,
    OpeningService,
    InvitationsService,
    SignInThrottle,
    MetadataScanner,
    { provide: APP_GUARD, useClass: AccessGuard },
  ],
  exports: [InvitationsService, SessionsModule],
})
export class AuthModule implements OnModuleInit {
  constructor(
    private readonly discovery: DiscoveryService,
    private readonly scanner: MetadataScanner,
    private readonly reflector: Reflector,
  ) {}

  onModuleInit(): void {
    assertDeclaredAccess(this.discovery, this.scanner, this.reflector);
  }
}

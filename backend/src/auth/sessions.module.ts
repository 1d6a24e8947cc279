import { Module } from '@nestjs/common';
import { JwtModule } from '@nestjs/jwt';
import { TypeOrmModule } from '@nestjs/typeorm';
import { SETTINGS, type Settings } from '../settings/settings.js';
import { SessionEntity } from './entities/session.entity.js';
import { sessionSecret } from './session-secret.js';
import { SessionsService } from './sessions.service.js';

@Module({
  imports: [
    TypeOrmModule.forFeature([SessionEntity]),
    JwtModule.registerAsync({
      inject: [SETTINGS],
      useFactory: (settings: Settings) => ({
        secret: sessionSecret(settings.dataDir),
        signOptions: { algorithm: 'HS256' as const },
        verifyOptions: { algorithms: ['HS256' as const] },
      }),
    }),
  ],
  providers: [SessionsService],
  exports: [SessionsService],
})
export class SessionsModule {}

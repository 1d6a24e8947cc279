import { createSecretKey } from 'node:crypto';
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
        // As a key object: a text would be tried as a public key first, with every request.
        secret: createSecretKey(sessionSecret(settings.dataDir), 'utf8'),
        signOptions: { algorithm: 'HS256' as const },
        verifyOptions: { algorithms: ['HS256' as const] },
      }),
    }),
  ],
  providers: [SessionsService],
  exports: [SessionsService],
})
export class SessionsModule {}

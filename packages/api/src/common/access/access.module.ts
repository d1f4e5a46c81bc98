import { Global, Module } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { JwtModule } from '@nestjs/jwt';
import { PassportModule } from '@nestjs/passport';
import { Settings } from '../config/settings.js';
import { AccessGuard } from './access.guard.js';
import {
  ACCESS_TOKEN_SECONDS,
  AccessTokens,
  TOKEN_ALGORITHM,
  TOKEN_AUDIENCE,
  TOKEN_ISSUER,
  tokenKey,
} from './access-tokens.js';
import { ActorReader } from './actor-reader.js';
import { JwtStrategy } from './jwt.strategy.js';
import { KnownTokens } from './known-tokens.js';

@Global()
@Module({
  imports: [
    PassportModule.register({ session: false }),
    JwtModule.registerAsync({
      inject: [Settings],
      useFactory: (settings: Settings) => ({
        secret: tokenKey(settings) as never,
        signOptions: {
          algorithm: TOKEN_ALGORITHM,
          expiresIn: ACCESS_TOKEN_SECONDS,
          issuer: TOKEN_ISSUER,
          audience: TOKEN_AUDIENCE,
        },
        verifyOptions: { algorithms: [TOKEN_ALGORITHM], issuer: TOKEN_ISSUER, audience: TOKEN_AUDIENCE },
      }),
    }),
  ],
  providers: [
    ActorReader,
    AccessTokens,
    KnownTokens,
    JwtStrategy,
    { provide: APP_GUARD, useClass: AccessGuard },
  ],
  exports: [ActorReader, AccessTokens],
})
export class AccessModule {}

import { Injectable } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import type { Actor } from '@rivetside/shared';
import { ExtractJwt, Strategy } from 'passport-jwt';
import { Settings } from '../config/settings.js';
import {
  TOKEN_ALGORITHM,
  TOKEN_AUDIENCE,
  TOKEN_ISSUER,
  type TokenClaims,
  tokenKey,
} from './access-tokens.js';
import { ActorReader } from './actor-reader.js';

@Injectable()
export class JwtStrategy extends PassportStrategy(Strategy) {
  constructor(
    settings: Settings,
    private readonly actors: ActorReader,
  ) {
    super({
      jwtFromRequest: ExtractJwt.fromAuthHeaderAsBearerToken(),
      // passport-jwt hands the key on to jsonwebtoken, which takes a KeyObject; its types know text only.
      secretOrKey: tokenKey(settings) as never,
      algorithms: [TOKEN_ALGORITHM],
      issuer: TOKEN_ISSUER,
      audience: TOKEN_AUDIENCE,
    });
  }

  validate(claims: TokenClaims): Actor | null {
    const actor = typeof claims.sid === 'string' ? this.actors.ofSession(claims.sid) : null;
    return actor?.id === claims.sub ? actor : null;
  }
}

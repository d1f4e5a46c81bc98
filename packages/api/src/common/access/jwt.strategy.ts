import { Injectable } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import type { Actor } from '@rivetside/shared';
import { ExtractJwt, Strategy } from 'passport-jwt';
import { Settings } from '../config/settings.js';
import { claimsOf, TOKEN_ALGORITHM, TOKEN_AUDIENCE, TOKEN_ISSUER, tokenKey } from './access-tokens.js';
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

  validate(payload: unknown): Actor | null {
    const claims = claimsOf(payload);
    return claims && this.actors.ofClaims(claims);
  }
}

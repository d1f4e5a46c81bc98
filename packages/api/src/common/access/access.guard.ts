import { type ExecutionContext, Injectable } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { AuthGuard } from '@nestjs/passport';
import { type Actor, rolesOf } from '@rivetside/shared';
import { NotAllowed, NotSignedIn } from '../errors/app-error.js';
import { ActorReader } from './actor-reader.js';
import { ACCESS_ROLES, type AccessRole, type SignedInRequest } from './access.decorator.js';
import { KnownTokens } from './known-tokens.js';

/** Closed by default: a route that declares no access refuses everybody. Asked before the body is validated. */
@Injectable()
export class AccessGuard extends AuthGuard('jwt') {
  constructor(
    private readonly reflector: Reflector,
    private readonly tokens: KnownTokens,
    private readonly actors: ActorReader,
  ) {
    super();
  }

  override async canActivate(context: ExecutionContext): Promise<boolean> {
    // HTTP guards do not run for a socket's messages: the gateways ask at the handshake and at each door.
    if (context.getType() !== 'http') return true;
    const roles = this.reflector.getAllAndOverride<AccessRole[] | undefined>(ACCESS_ROLES, [
      context.getHandler(),
      context.getClass(),
    ]);
    if (!roles) throw new NotAllowed('This address is open to nobody.');
    if (roles.includes('guest')) return true;
    const user = await this.actorOf(context);
    if (!roles.includes('authenticated') && !rolesOf(user).some((role) => roles.includes(role)))
      throw new NotAllowed(`This is for ${roles.map((role) => ROLE_WORDS[role]).join(', ')}.`);
    return true;
  }

  private async actorOf(context: ExecutionContext): Promise<Actor> {
    const request = context.switchToHttp().getRequest<SignedInRequest>();
    const { authorization } = request.headers;
    const claims = this.tokens.claims(authorization);
    if (claims) return (request.user = this.handleRequest(null, this.actors.ofClaims(claims) ?? false));
    await super.canActivate(context);
    this.tokens.remember(authorization);
    return request.user;
  }

  override handleRequest<TUser = Actor>(error: unknown, user: TUser | false): TUser {
    if (error || !user) throw new NotSignedIn();
    return user;
  }
}

const ROLE_WORDS: Readonly<Record<AccessRole, string>> = {
  guest: 'everybody',
  authenticated: 'whoever is signed in',
  builder: 'builders',
  mentor: 'mentors',
  chapterAdmin: 'chapter admins',
  steward: 'kit stewards',
  siteAdmin: 'site admins',
};

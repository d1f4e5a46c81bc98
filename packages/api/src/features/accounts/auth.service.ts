import { Injectable, Logger } from '@nestjs/common';
import type { SignedIn, SignIn } from '@rivetside/shared';
import type { FastifyReply, FastifyRequest } from 'fastify';
import { ACCESS_TOKEN_SECONDS, AccessTokens } from '../../common/access/access-tokens.js';
import { NotSignedIn } from '../../common/errors/app-error.js';
import { networkOf } from '../../common/limits/network-of.js';
import { AccountsService } from './accounts.service.js';
import { DeviceCookie } from './device-cookie.js';
import { MeService } from './me.service.js';
import { RefreshCookie } from './refresh-cookie.js';
import { type OpenedSession, SessionsService } from './sessions.service.js';
import { SignInGate } from './sign-in-gate.js';

/** The wire side of a session: cookies and tokens around what the services decide. */
@Injectable()
export class AuthService {
  private readonly logger = new Logger('SignIn');

  constructor(
    private readonly accounts: AccountsService,
    private readonly sessions: SessionsService,
    private readonly me: MeService,
    private readonly tokens: AccessTokens,
    private readonly refreshCookie: RefreshCookie,
    private readonly deviceCookie: DeviceCookie,
    private readonly gate: SignInGate,
  ) {}

  async signIn(input: SignIn, request: FastifyRequest, reply: FastifyReply): Promise<SignedIn> {
    const device = this.deviceCookie.read(request, input.email);
    const caller = { email: input.email, network: networkOf(request.ip), device };
    const from = { userAgent: request.headers['user-agent'], earlier: this.refreshCookie.read(request) };
    const session = await this.gate.admit(caller, () => this.accounts.signIn(input, from));
    const { userId, sessionId } = session;
    this.logger.log({ requestId: request.id, userId, sessionId }, 'signed in');
    const answer = await this.signedIn(session, reply);
    this.deviceCookie.write(reply, input.email, device);
    return answer;
  }

  async refresh(request: FastifyRequest, reply: FastifyReply): Promise<SignedIn> {
    const token = this.refreshCookie.read(request);
    if (!token) throw new NotSignedIn();
    try {
      return await this.signedIn(await this.sessions.refresh(token), reply);
    } catch (error) {
      if (error instanceof NotSignedIn) this.refreshCookie.clear(reply);
      throw error;
    }
  }

  /** By the cookie, and by the access token where one is sent: a client without cookies signs out as well. */
  async signOut(request: FastifyRequest, reply: FastifyReply): Promise<void> {
    const token = this.refreshCookie.read(request);
    if (token) await this.sessions.endByToken(token, 'signed out');
    const claims = this.tokens.verify(/^Bearer (.+)$/i.exec(request.headers.authorization ?? '')?.[1] ?? '');
    if (claims) await this.sessions.endById(claims.sid, 'signed out');
    this.refreshCookie.clear(reply);
  }

  private async signedIn(
    { userId, sessionId, refreshToken }: OpenedSession,
    reply: FastifyReply,
  ): Promise<SignedIn> {
    this.refreshCookie.write(reply, refreshToken);
    const accessToken = this.tokens.issue(userId, sessionId);
    return { accessToken, expiresIn: ACCESS_TOKEN_SECONDS, user: await this.me.read(userId) };
  }
}

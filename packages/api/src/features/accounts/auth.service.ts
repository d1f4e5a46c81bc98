import { Injectable } from '@nestjs/common';
import type { ForgotPassword, ResetPassword, SignedIn, SignIn, SignUp } from '@rivetside/shared';
import type { FastifyReply, FastifyRequest } from 'fastify';
import { ACCESS_TOKEN_SECONDS, AccessTokens } from '../../common/access/access-tokens.js';
import { NotSignedIn } from '../../common/errors/app-error.js';
import { Tries, type TryLimit } from '../../common/limits/tries.js';
import { AccountsService } from './accounts.service.js';
import { MeService } from './me.service.js';
import { RefreshCookie } from './refresh-cookie.js';
import { type OpenedSession, SessionsService } from './sessions.service.js';

const QUARTER_HOUR = 15 * 60_000;
/** Per account and address together: a stranger who guesses elsewhere does not lock the owner out. */
const WRONG_PASSWORDS: TryLimit = { name: 'wrong-password', most: 10, withinMs: QUARTER_HOUR };
const WRONG_FROM_ADDRESS: TryLimit = { name: 'wrong-from-address', most: 300, withinMs: QUARTER_HOUR };
const SIGN_UPS: TryLimit = { name: 'sign-up', most: 100, withinMs: QUARTER_HOUR };
const RESETS: TryLimit = { name: 'reset', most: 5, withinMs: QUARTER_HOUR };

const MAIL_SENT = { message: 'If the address is right, a mail is on its way. Look in the spam folder too.' };

/** The wire side of sign-in: limits, cookie and token around what the accounts service decides. */
@Injectable()
export class AuthService {
  constructor(
    private readonly accounts: AccountsService,
    private readonly sessions: SessionsService,
    private readonly me: MeService,
    private readonly tokens: AccessTokens,
    private readonly cookie: RefreshCookie,
    private readonly tries: Tries,
  ) {}

  async signUp(input: SignUp, address: string) {
    await this.tries.count(SIGN_UPS, address);
    await this.accounts.signUp(input);
    return MAIL_SENT;
  }

  confirmEmail(token: string): Promise<void> {
    return this.accounts.confirmEmail(token);
  }

  async signIn(input: SignIn, request: FastifyRequest, reply: FastifyReply): Promise<SignedIn> {
    const who = `${input.email}\n${request.ip}`;
    // Counted before the password is looked at, and forgiven after: tries in parallel cannot slip past the limit.
    await this.tries.count(WRONG_PASSWORDS, who);
    try {
      const session = await this.accounts.signIn(input, request.headers['user-agent']);
      this.tries.forgive(WRONG_PASSWORDS, who);
      return await this.signedIn(session, reply);
    } catch (error) {
      if (error instanceof NotSignedIn) await this.tries.count(WRONG_FROM_ADDRESS, request.ip);
      throw error;
    }
  }

  async refresh(request: FastifyRequest, reply: FastifyReply): Promise<SignedIn> {
    const token = this.cookie.read(request);
    if (!token) throw new NotSignedIn();
    try {
      return await this.signedIn(await this.sessions.refresh(token), reply);
    } catch (error) {
      if (error instanceof NotSignedIn) this.cookie.clear(reply);
      throw error;
    }
  }

  async signOut(request: FastifyRequest, reply: FastifyReply): Promise<void> {
    const token = this.cookie.read(request);
    if (token) await this.sessions.endByToken(token, 'signed out');
    this.cookie.clear(reply);
  }

  async forgotPassword(input: ForgotPassword, address: string) {
    await this.tries.count(RESETS, `${input.email}\n${address}`);
    await this.accounts.forgotPassword(input);
    return MAIL_SENT;
  }

  resetPassword(input: ResetPassword): Promise<void> {
    return this.accounts.resetPassword(input);
  }

  private async signedIn(
    { userId, sessionId, refreshToken }: OpenedSession,
    reply: FastifyReply,
  ): Promise<SignedIn> {
    this.cookie.write(reply, refreshToken);
    const accessToken = this.tokens.issue(userId, sessionId);
    return { accessToken, expiresIn: ACCESS_TOKEN_SECONDS, user: await this.me.read(userId) };
  }
}

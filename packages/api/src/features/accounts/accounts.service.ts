import { Injectable } from '@nestjs/common';
import type { ForgotPassword, ResetPassword, SignIn, SignUp } from '@rivetside/shared';
import { writeAudit } from '../../common/audit/audit.js';
import { Settings } from '../../common/config/settings.js';
import { Reader } from '../../common/database/reader.js';
import { type Tx, UnitOfWork } from '../../common/database/unit-of-work.js';
import { NotAllowed, NotSignedIn } from '../../common/errors/app-error.js';
import { newId } from '../../common/ids.js';
import { queueMail } from '../../common/mail/mail.js';
import { Clock } from '../../common/time/clock.js';
import { confirmLetter, haveAccountLetter, passwordChangedLetter, resetLetter } from './account-letters.js';
import { issueMailToken, takeMailToken } from './mail-tokens.js';
import { Passwords } from './passwords.js';
import { type OpenedSession, SessionsService } from './sessions.service.js';
import { UserEntity } from './user.entity.js';

/** How somebody gets an account and in and out of it. Nothing here tells whether an address has one. */
@Injectable()
export class AccountsService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly reader: Reader,
    private readonly passwords: Passwords,
    private readonly sessions: SessionsService,
    private readonly settings: Settings,
    private readonly clock: Clock,
  ) {}

  async signUp({ email, password, name }: SignUp): Promise<void> {
    this.passwords.refuseCommon(password, 'password', [email.split('@')[0]!, name]);
    // Hashed in both cases, so that both take the same time.
    const passwordHash = await this.passwords.hash(password);
    await this.unitOfWork.run(async (tx) => {
      const known = await tx.manager.findOneBy(UserEntity, { email });
      const at = this.clock.instant();
      if (known?.emailConfirmedAt) {
        await queueMail(tx.manager, haveAccountLetter(known, this.link('/forgotten')), at);
        return;
      }
      const user = known ?? (await this.addUser(tx, { email, name, passwordHash, at }));
      await this.sendConfirmation(tx, user);
    });
  }

  async confirmEmail(token: string): Promise<void> {
    await this.unitOfWork.run(async (tx) => {
      const at = this.clock.instant();
      const taken = await takeMailToken(tx.manager, token, ['confirmEmail', 'changeEmail'], at);
      const change = taken.purpose === 'changeEmail' && taken.email ? { email: taken.email } : {};
      await tx.manager.update(UserEntity, { id: taken.userId }, { emailConfirmedAt: at, ...change });
      await writeAudit(tx.manager, {
        at,
        byId: taken.userId,
        what: 'email.confirmed',
        subject: ['user', taken.userId],
      });
    });
  }

  async signIn({ email, password }: SignIn, userAgent: string | undefined): Promise<OpenedSession> {
    const user = await this.reader.manager.findOneBy(UserEntity, { email });
    const matched = await this.passwords.matches(password, user?.passwordHash ?? null);
    if (!user || !matched || user.disabledAt) throw new NotSignedIn('Address or password is not right.');
    if (!user.emailConfirmedAt) {
      await this.unitOfWork.run((tx) => this.sendConfirmation(tx, user));
      throw new NotAllowed('Confirm your address first: we have sent you the link again.');
    }
    return this.unitOfWork.run((tx) => this.sessions.open(tx, user.id, userAgent));
  }

  async forgotPassword({ email }: ForgotPassword): Promise<void> {
    await this.unitOfWork.run(async (tx) => {
      const user = await tx.manager.findOneBy(UserEntity, { email });
      if (!user || user.disabledAt) return;
      const token = await issueMailToken(tx.manager, {
        userId: user.id,
        purpose: 'resetPassword',
        now: this.clock.now(),
      });
      await queueMail(
        tx.manager,
        resetLetter(user, this.link(`/reset-password?token=${token}`)),
        this.clock.instant(),
      );
    });
  }

  async resetPassword({ token, password }: ResetPassword): Promise<void> {
    this.passwords.refuseCommon(password, 'password', []);
    const passwordHash = await this.passwords.hash(password);
    await this.unitOfWork.run(async (tx) => {
      const at = this.clock.instant();
      const { userId } = await takeMailToken(tx.manager, token, ['resetPassword'], at);
      const user = await tx.manager.findOneByOrFail(UserEntity, { id: userId });
      // Whoever reads the mail owns the address.
      await tx.manager.update(
        UserEntity,
        { id: userId },
        { passwordHash, emailConfirmedAt: user.emailConfirmedAt ?? at },
      );
      await this.sessions.endAll(tx, userId, 'the password was set anew');
      await queueMail(tx.manager, passwordChangedLetter(user), at);
      await writeAudit(tx.manager, { at, byId: userId, what: 'password.reset', subject: ['user', userId] });
    });
  }

  private async addUser(
    tx: Tx,
    { email, name, passwordHash, at }: { email: string; name: string; passwordHash: string; at: string },
  ) {
    const user = Object.assign(new UserEntity(), {
      id: newId(),
      email,
      name,
      passwordHash,
      emailConfirmedAt: null,
      units: 'inch' as const,
      zone: 'Europe/London',
      siteRole: null,
      disabledAt: null,
      createdAt: at,
    });
    return tx.manager.save(user);
  }

  private async sendConfirmation(tx: Tx, user: UserEntity): Promise<void> {
    const token = await issueMailToken(tx.manager, {
      userId: user.id,
      purpose: 'confirmEmail',
      now: this.clock.now(),
    });
    await queueMail(
      tx.manager,
      confirmLetter(user, this.link(`/confirm-email?token=${token}`)),
      this.clock.instant(),
    );
  }

  private link(path: string): string {
    return `${this.settings.publicUrl}${path}`;
  }
}

import { Injectable } from '@nestjs/common';
import type { ForgotPassword, ResetPassword, SignIn } from '@rivetside/shared';
import { writeAudit } from '../../common/audit/audit.js';
import { Reader } from '../../common/database/reader.js';
import { UnitOfWork } from '../../common/database/unit-of-work.js';
import { NotAllowed, NotSignedIn } from '../../common/errors/app-error.js';
import { Clock } from '../../common/time/clock.js';
import { AccountMails } from './account-mails.js';
import { deadLink, requireMailToken, takeMailToken } from './mail-tokens.js';
import { Passwords } from './passwords.js';
import { type OpenedSession, type SessionFrom, SessionsService } from './sessions.service.js';
import { UserEntity } from './user.entity.js';

/** How somebody gets in again and again. Nothing here tells whether an address has an account. */
@Injectable()
export class AccountsService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly reader: Reader,
    private readonly passwords: Passwords,
    private readonly sessions: SessionsService,
    private readonly mails: AccountMails,
    private readonly clock: Clock,
  ) {}

  /** That an address waits for its link is told only to whoever knows the password. */
  async signIn({ email, password }: SignIn, from: SessionFrom): Promise<OpenedSession> {
    const user = await this.reader.manager.findOneBy(UserEntity, { email });
    const matched = await this.passwords.matches(password, user?.passwordHash ?? null);
    if (!user || !matched || user.disabledAt) throw new NotSignedIn('Address or password is not right.');
    if (!user.emailConfirmedAt) {
      await this.unitOfWork.run((tx) => this.mails.confirm(tx, user, user.passwordHash));
      throw new NotAllowed('Confirm your address first: we have sent you the link again.');
    }
    return this.unitOfWork.run(async (tx) => {
      // Looked at again: between the password and this unit it may have been changed, or the account closed.
      const now = await tx.manager.findOneBy(UserEntity, { id: user.id });
      if (!now || now.disabledAt || now.passwordHash !== user.passwordHash)
        throw new NotSignedIn('Address or password is not right.');
      return this.sessions.open(tx, user.id, from);
    });
  }

  async forgotPassword({ email }: ForgotPassword): Promise<void> {
    await this.unitOfWork.run(async (tx) => {
      const user = await tx.manager.findOneBy(UserEntity, { email });
      if (!user || user.disabledAt) return this.mails.nobody(tx);
      return this.mails.reset(tx, user);
    });
  }

  async resetPassword({ token, password }: ResetPassword): Promise<void> {
    // Before the hash: a made-up link shall not cost a hash.
    const user = await this.ownerOf(token);
    this.passwords.refuseCommon(password, 'password', [user.email.split('@')[0]!, user.name]);
    const passwordHash = await this.passwords.hash(password);
    await this.unitOfWork.run(async (tx) => {
      const at = this.clock.instant();
      const { userId } = await takeMailToken(tx.manager, token, ['resetPassword'], at);
      // Whoever reads the mail owns the address.
      const emailConfirmedAt = user.emailConfirmedAt ?? at;
      await tx.manager.update(UserEntity, { id: userId }, { passwordHash, emailConfirmedAt });
      await this.sessions.endAll(tx, userId, 'the password was set anew');
      await this.mails.passwordChanged(tx, user);
      await writeAudit(tx.manager, { at, byId: userId, what: 'password.reset', subject: ['user', userId] });
    });
  }

  private async ownerOf(token: string): Promise<UserEntity> {
    const { manager } = this.reader;
    const { userId } = await requireMailToken(manager, token, ['resetPassword'], this.clock.instant());
    const user = await manager.findOneBy(UserEntity, { id: userId });
    if (!user || user.disabledAt) throw deadLink();
    return user;
  }
}

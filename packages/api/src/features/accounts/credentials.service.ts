import { Injectable } from '@nestjs/common';
import type { Actor, ChangeEmail, ChangePassword, MailSent } from '@rivetside/shared';
import { writeAudit } from '../../common/audit/audit.js';
import { type Tx, UnitOfWork } from '../../common/database/unit-of-work.js';
import { Reader } from '../../common/database/reader.js';
import { BadInput } from '../../common/errors/app-error.js';
import { Tries } from '../../common/limits/tries.js';
import { Clock } from '../../common/time/clock.js';
import { AccountMails, MAIL_SENT } from './account-mails.js';
import { WRONG_BY_OWNER } from './limits.js';
import { MailTokenEntity } from './mail-token.entity.js';
import { Passwords } from './passwords.js';
import { SessionsService } from './sessions.service.js';
import { UserEntity } from './user.entity.js';

/** What opens one's account: changed only by whoever knows the password, not by whoever found it open. */
@Injectable()
export class CredentialsService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly reader: Reader,
    private readonly passwords: Passwords,
    private readonly sessions: SessionsService,
    private readonly mails: AccountMails,
    private readonly tries: Tries,
    private readonly clock: Clock,
  ) {}

  async changePassword(actor: Actor, { password, newPassword }: ChangePassword): Promise<void> {
    const user = await this.requirePassword(actor, password);
    this.passwords.refuseCommon(newPassword, 'newPassword', [user.email.split('@')[0]!, user.name]);
    const passwordHash = await this.passwords.hash(newPassword);
    await this.unitOfWork.run(async (tx) => {
      await tx.manager.update(UserEntity, { id: actor.id }, { passwordHash });
      // Links that were mailed before the change may be what made it needed.
      await tx.manager.delete(MailTokenEntity, { userId: actor.id });
      await this.sessions.endAll(tx, actor.id, 'the password was changed', actor.sessionId);
      await this.mails.passwordChanged(tx, user);
      await this.audit(tx, actor, 'password.changed');
    });
  }

  /** The new address counts once its link was pressed. One that has an account already gets no mail and no word here. */
  async changeEmail(actor: Actor, { password, email }: ChangeEmail): Promise<MailSent> {
    const user = await this.requirePassword(actor, password);
    return this.unitOfWork.run(async (tx) => {
      const there = await tx.manager.findOneBy(UserEntity, { email });
      await (there?.emailConfirmedAt ? this.mails.nobody(tx) : this.mails.changeEmail(tx, user, email));
      await this.audit(tx, actor, 'email.change-asked');
      return MAIL_SENT;
    });
  }

  private async requirePassword(actor: Actor, password: string): Promise<UserEntity> {
    this.tries.refuseIfSpent(WRONG_BY_OWNER, actor.id);
    const user = await this.reader.manager.findOneByOrFail(UserEntity, { id: actor.id });
    if (!(await this.passwords.matches(password, user.passwordHash))) {
      this.tries.count(WRONG_BY_OWNER, actor.id);
      throw new BadInput([{ path: 'password', message: 'This is not your password.' }]);
    }
    this.tries.forgive(WRONG_BY_OWNER, actor.id);
    return user;
  }

  private audit(tx: Tx, actor: Actor, what: string): Promise<void> {
    const at = this.clock.instant();
    return writeAudit(tx.manager, { at, byId: actor.id, what, subject: ['user', actor.id] });
  }
}

import { Injectable } from '@nestjs/common';
import type { Actor, ChangeEmail, ChangeMe, ChangePassword, Me } from '@rivetside/shared';
import { ActorReader } from '../../common/access/actor-reader.js';
import { writeAudit } from '../../common/audit/audit.js';
import { Settings } from '../../common/config/settings.js';
import { Reader } from '../../common/database/reader.js';
import { UnitOfWork } from '../../common/database/unit-of-work.js';
import { BadInput, NotFound } from '../../common/errors/app-error.js';
import { queueMail } from '../../common/mail/mail.js';
import { Clock } from '../../common/time/clock.js';
import { changeEmailLetter, passwordChangedLetter } from './account-letters.js';
import { issueMailToken } from './mail-tokens.js';
import { Passwords } from './passwords.js';
import { SessionsService } from './sessions.service.js';
import { UserEntity } from './user.entity.js';

/** One's own account. */
@Injectable()
export class MeService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly reader: Reader,
    private readonly actors: ActorReader,
    private readonly passwords: Passwords,
    private readonly sessions: SessionsService,
    private readonly settings: Settings,
    private readonly clock: Clock,
  ) {}

  async read(userId: string): Promise<Me> {
    const user = await this.reader.manager.findOneBy(UserEntity, { id: userId });
    if (!user) throw new NotFound('account');
    const { id, name, email, units, zone, siteRole } = user;
    return { id, name, email, units, zone, memberships: this.actors.membershipsOf(id), siteRole };
  }

  async change(actor: Actor, input: ChangeMe): Promise<Me> {
    if (Object.keys(input).length > 0)
      await this.unitOfWork.run((tx) => tx.manager.update(UserEntity, { id: actor.id }, input));
    return this.read(actor.id);
  }

  async changePassword(actor: Actor, { password, newPassword }: ChangePassword): Promise<void> {
    const user = await this.requirePassword(actor, password);
    this.passwords.refuseCommon(newPassword, 'newPassword', [user.email.split('@')[0]!, user.name]);
    const passwordHash = await this.passwords.hash(newPassword);
    await this.unitOfWork.run(async (tx) => {
      const at = this.clock.instant();
      await tx.manager.update(UserEntity, { id: actor.id }, { passwordHash });
      await this.sessions.endAll(tx, actor.id, 'the password was changed', actor.sessionId);
      await queueMail(tx.manager, passwordChangedLetter(user), at);
      await writeAudit(tx.manager, {
        at,
        byId: actor.id,
        what: 'password.changed',
        subject: ['user', actor.id],
      });
    });
  }

  /** The new address counts once its link was pressed. One that has an account already gets no mail and no word here. */
  async changeEmail(actor: Actor, { password, email }: ChangeEmail): Promise<void> {
    const user = await this.requirePassword(actor, password);
    await this.unitOfWork.run(async (tx) => {
      if (await tx.manager.existsBy(UserEntity, { email })) return;
      const token = await issueMailToken(tx.manager, {
        userId: actor.id,
        purpose: 'changeEmail',
        email,
        now: this.clock.now(),
      });
      const url = `${this.settings.publicUrl}/confirm-email?token=${token}`;
      await queueMail(tx.manager, changeEmailLetter({ email, name: user.name }, url), this.clock.instant());
    });
  }

  private async requirePassword(actor: Actor, password: string): Promise<UserEntity> {
    const user = await this.reader.manager.findOneByOrFail(UserEntity, { id: actor.id });
    if (!(await this.passwords.matches(password, user.passwordHash)))
      throw new BadInput([{ path: 'password', message: 'This is not your password.' }]);
    return user;
  }
}

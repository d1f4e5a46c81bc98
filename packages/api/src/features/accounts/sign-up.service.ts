import { Injectable } from '@nestjs/common';
import type { SignUp } from '@rivetside/shared';
import { writeAudit } from '../../common/audit/audit.js';
import { type Tx, UnitOfWork } from '../../common/database/unit-of-work.js';
import { BadInput } from '../../common/errors/app-error.js';
import { newId } from '../../common/ids.js';
import { Clock } from '../../common/time/clock.js';
import { AccountMails } from './account-mails.js';
import type { MailTokenEntity } from './mail-token.entity.js';
import { takeMailToken } from './mail-tokens.js';
import { Passwords } from './passwords.js';
import { SignUpEntity } from './sign-up.entity.js';
import { UserEntity } from './user.entity.js';

/** How somebody gets an account. Nothing here tells whether an address has one. */
@Injectable()
export class SignUpService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly passwords: Passwords,
    private readonly mails: AccountMails,
    private readonly clock: Clock,
  ) {}

  async signUp({ email, password, name }: SignUp): Promise<void> {
    this.passwords.refuseCommon(password, 'password', [email.split('@')[0]!, name]);
    // Hashed in both cases, so that both take the same time.
    const passwordHash = await this.passwords.hash(password);
    await this.unitOfWork.run(async (tx) => {
      const known = await tx.manager.findOneBy(UserEntity, { email });
      if (known?.disabledAt) return this.mails.nobody(tx);
      if (known?.emailConfirmedAt) return this.mails.haveAccount(tx, known);
      const user = await tx.manager.save(Object.assign(known ?? this.newUser(email), { name, passwordHash }));
      return this.mails.confirm(tx, user, passwordHash);
    });
  }

  /** The link of a sign-up, or of a changed address. */
  async confirmEmail(token: string): Promise<void> {
    await this.unitOfWork.run(async (tx) => {
      const at = this.clock.instant();
      const taken = await takeMailToken(tx.manager, token, ['confirmEmail', 'changeEmail'], at);
      const user = await tx.manager.findOneByOrFail(UserEntity, { id: taken.userId });
      if (taken.purpose === 'changeEmail') await this.moveTo(tx, user, taken.email!);
      else await this.open(tx, user, taken);
      await writeAudit(tx.manager, {
        at,
        byId: user.id,
        what: taken.purpose === 'changeEmail' ? 'email.changed' : 'email.confirmed',
        subject: ['user', user.id],
      });
    });
  }

  /** With what was signed up with when this link was mailed, not with what somebody else sent in between. */
  private async open(tx: Tx, user: UserEntity, { hash }: MailTokenEntity): Promise<void> {
    const signedUp = await tx.manager.findOneBy(SignUpEntity, { hash });
    const { name, passwordHash } = signedUp ?? user;
    const emailConfirmedAt = this.clock.instant();
    await tx.manager.update(UserEntity, { id: user.id }, { name, passwordHash, emailConfirmedAt });
    await tx.manager.delete(SignUpEntity, { hash });
  }

  private async moveTo(tx: Tx, user: UserEntity, email: string): Promise<void> {
    const there = await tx.manager.findOneBy(UserEntity, { email });
    if (there?.emailConfirmedAt)
      throw new BadInput([{ path: 'token', message: 'This address has an account of its own by now.' }]);
    // Somebody once signed up with it and never pressed the link: whoever reads its mail goes first.
    if (there) await tx.manager.delete(UserEntity, { id: there.id });
    await tx.manager.update(UserEntity, { id: user.id }, { email, emailConfirmedAt: this.clock.instant() });
    await this.mails.emailChanged(tx, user);
  }

  private newUser(email: string): UserEntity {
    return Object.assign(new UserEntity(), {
      id: newId(),
      email,
      emailConfirmedAt: null,
      units: 'inch' as const,
      zone: 'Europe/London',
      siteRole: null,
      disabledAt: null,
      createdAt: this.clock.instant(),
    });
  }
}

import { Injectable } from '@nestjs/common';
import { Settings } from '../../common/config/settings.js';
import type { Tx } from '../../common/database/unit-of-work.js';
import { Tries } from '../../common/limits/tries.js';
import { type Mail, queueMail, queueNobodysMail } from '../../common/mail/mail.js';
import { Clock } from '../../common/time/clock.js';
import {
  changeEmailLetter,
  confirmLetter,
  emailChangedLetter,
  haveAccountLetter,
  passwordChangedLetter,
  resetLetter,
} from './account-letters.js';
import { MAILS_TO_ONE } from './limits.js';
import { issueMailToken } from './mail-tokens.js';
import { SignUpEntity } from './sign-up.entity.js';
import { hashToken } from './tokens.js';

/** Said to everybody, whether or not the address has an account. */
export const MAIL_SENT = {
  message: 'If the address is right, a mail is on its way. Look in the spam folder too.',
};

interface Owner {
  readonly id: string;
  readonly email: string;
  readonly name: string;
}

/** The letters about an account, each written in the unit of what it tells of. */
@Injectable()
export class AccountMails {
  constructor(
    private readonly tries: Tries,
    private readonly settings: Settings,
    private readonly clock: Clock,
  ) {}

  /** What was signed up with counts when this very link is pressed. */
  async confirm(tx: Tx, owner: Owner, passwordHash: string): Promise<void> {
    if (this.hasHad('confirm', owner.email)) return this.nobody(tx);
    const token = await this.token(tx, { userId: owner.id, purpose: 'confirmEmail' });
    await tx.manager.insert(SignUpEntity, { hash: hashToken(token), name: owner.name, passwordHash });
    await this.queue(tx, confirmLetter(owner, this.link(`/confirm-email?token=${token}`)));
  }

  async haveAccount(tx: Tx, owner: Owner): Promise<void> {
    if (this.hasHad('have-account', owner.email)) return this.nobody(tx);
    await this.queue(tx, haveAccountLetter(owner, this.link('/forgotten')));
  }

  async reset(tx: Tx, owner: Owner): Promise<void> {
    if (this.hasHad('reset', owner.email)) return this.nobody(tx);
    const token = await this.token(tx, { userId: owner.id, purpose: 'resetPassword' });
    await this.queue(tx, resetLetter(owner, this.link(`/reset-password?token=${token}`)));
  }

  async changeEmail(tx: Tx, owner: Owner, email: string): Promise<void> {
    if (this.hasHad('change-email', email)) return this.nobody(tx);
    const token = await this.token(tx, { userId: owner.id, purpose: 'changeEmail', email });
    const url = this.link(`/confirm-email?token=${token}`);
    await this.queue(tx, changeEmailLetter({ email, name: owner.name }, url));
  }

  passwordChanged(tx: Tx, owner: Owner): Promise<void> {
    return this.queue(tx, passwordChangedLetter(owner, this.link('/forgotten')));
  }

  /** To the old address: whoever took the account over reads the new one. */
  emailChanged(tx: Tx, owner: Owner): Promise<void> {
    return this.queue(tx, emailChangedLetter(owner));
  }

  /** Writes as much as a letter does, so that the answer takes the same time whether or not there is an account. */
  nobody(tx: Tx): Promise<void> {
    return queueNobodysMail(tx.manager, this.clock.instant());
  }

  /** A mailbox is not flooded by whoever knows its address. */
  private hasHad(kind: string, email: string): boolean {
    const who = `${kind}\n${email}`;
    if (this.tries.isSpent(MAILS_TO_ONE, who)) return true;
    this.tries.count(MAILS_TO_ONE, who);
    return false;
  }

  private token(tx: Tx, facts: Omit<Parameters<typeof issueMailToken>[1], 'now'>): Promise<string> {
    return issueMailToken(tx.manager, { ...facts, now: this.clock.now() });
  }

  private async queue(tx: Tx, mail: Mail): Promise<void> {
    await queueMail(tx.manager, mail, this.clock.instant());
  }

  private link(path: string): string {
    return `${this.settings.publicUrl}${path}`;
  }
}

import { Injectable } from '@nestjs/common';
import type { ForgotPassword, MailSent, ResetPassword, SignUp } from '@rivetside/shared';
import { BadInput } from '../../common/errors/app-error.js';
import { networkOf } from '../../common/limits/network-of.js';
import { Tries } from '../../common/limits/tries.js';
import { MAIL_SENT } from './account-mails.js';
import { AccountsService } from './accounts.service.js';
import { DEAD_LINKS, RESETS, RESETS_FROM_ADDRESS, SIGN_UPS } from './limits.js';
import { SignUpService } from './sign-up.service.js';

/** What goes by mailed links, within limits. `address` is where the request comes from. */
@Injectable()
export class LinksService {
  constructor(
    private readonly signUps: SignUpService,
    private readonly accounts: AccountsService,
    private readonly tries: Tries,
  ) {}

  async signUp(input: SignUp, address: string): Promise<MailSent> {
    this.tries.take(SIGN_UPS, networkOf(address));
    await this.signUps.signUp(input);
    return MAIL_SENT;
  }

  confirmEmail(token: string, address: string): Promise<void> {
    return this.pressed(address, () => this.signUps.confirmEmail(token));
  }

  async forgotPassword(input: ForgotPassword, address: string): Promise<MailSent> {
    const network = networkOf(address);
    this.tries.refuseIfSpent(RESETS_FROM_ADDRESS, network);
    this.tries.take(RESETS, `${input.email}\n${network}`);
    this.tries.count(RESETS_FROM_ADDRESS, network);
    await this.accounts.forgotPassword(input);
    return MAIL_SENT;
  }

  resetPassword(input: ResetPassword, address: string): Promise<void> {
    return this.pressed(address, () => this.accounts.resetPassword(input));
  }

  /** Links are too long to guess; whoever sends made-up ones anyway is held off. */
  private async pressed(address: string, work: () => Promise<void>): Promise<void> {
    const network = networkOf(address);
    this.tries.refuseIfSpent(DEAD_LINKS, network);
    try {
      await work();
    } catch (error) {
      if (error instanceof BadInput) this.tries.count(DEAD_LINKS, network);
      throw error;
    }
  }
}

import { Module } from '@nestjs/common';
import { Tries } from '../../common/limits/tries.js';
import { AccountMails } from './account-mails.js';
import { AccountsJob } from './accounts.job.js';
import { AccountsRealtime } from './accounts.realtime.js';
import { AccountsService } from './accounts.service.js';
import { AuthController } from './auth.controller.js';
import { AuthService } from './auth.service.js';
import { CredentialsService } from './credentials.service.js';
import { DeviceCookie } from './device-cookie.js';
import { LinksService } from './links.service.js';
import { MeController } from './me.controller.js';
import { MeService } from './me.service.js';
import { Passwords } from './passwords.js';
import { RefreshCookie } from './refresh-cookie.js';
import { SessionsService } from './sessions.service.js';
import { SignInGate } from './sign-in-gate.js';
import { SignUpService } from './sign-up.service.js';

@Module({
  controllers: [AuthController, MeController],
  providers: [
    AccountMails,
    AccountsJob,
    AccountsRealtime,
    AccountsService,
    AuthService,
    CredentialsService,
    DeviceCookie,
    LinksService,
    MeService,
    Passwords,
    RefreshCookie,
    SessionsService,
    SignInGate,
    SignUpService,
    Tries,
  ],
  exports: [SessionsService, Passwords],
})
export class AccountsModule {}

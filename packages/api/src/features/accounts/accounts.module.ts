import { Module } from '@nestjs/common';
import { Tries } from '../../common/limits/tries.js';
import { AccountsRealtime } from './accounts.realtime.js';
import { AccountsService } from './accounts.service.js';
import { AuthController } from './auth.controller.js';
import { AuthService } from './auth.service.js';
import { MeController } from './me.controller.js';
import { MeService } from './me.service.js';
import { Passwords } from './passwords.js';
import { RefreshCookie } from './refresh-cookie.js';
import { SessionsService } from './sessions.service.js';

@Module({
  controllers: [AuthController, MeController],
  providers: [
    AccountsService,
    AuthService,
    MeService,
    SessionsService,
    Passwords,
    RefreshCookie,
    Tries,
    AccountsRealtime,
  ],
  exports: [SessionsService, Passwords],
})
export class AccountsModule {}

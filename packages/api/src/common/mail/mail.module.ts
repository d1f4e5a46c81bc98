import { Global, Module } from '@nestjs/common';
import { DevMailController } from './dev-mail.controller.js';
import { MailCatcher } from './mail-catcher.js';
import { MailJob } from './mail.job.js';
import { MailTransport } from './mail-transport.js';
import { MailWorker } from './mail.worker.js';

@Global()
@Module({
  controllers: [DevMailController],
  providers: [MailCatcher, MailJob, MailTransport, MailWorker],
  exports: [MailWorker, MailCatcher],
})
export class MailModule {}

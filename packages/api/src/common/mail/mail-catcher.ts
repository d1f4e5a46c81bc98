import type { AddressInfo } from 'node:net';
import { Injectable, type OnApplicationShutdown } from '@nestjs/common';
import { type ParsedMail, simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';

const KEPT = 200;

/** Takes every mail where no SMTP_URL is set: a real server on the loopback, read at /dev/mail. */
@Injectable()
export class MailCatcher implements OnApplicationShutdown {
  readonly mails: ParsedMail[] = [];
  private server: SMTPServer | null = null;

  address(): Promise<string> {
    if (this.server) return Promise.resolve(this.url(this.server));
    const server = new SMTPServer({
      authOptional: true,
      disabledCommands: ['AUTH', 'STARTTLS'],
      onData: (stream, _session, done) => {
        simpleParser(stream).then(
          (mail) => {
            this.mails.unshift(mail);
            this.mails.length = Math.min(this.mails.length, KEPT);
            done();
          },
          (error: Error) => done(error),
        );
      },
    });
    this.server = server;
    return new Promise((resolve, reject) => {
      server.on('error', reject);
      server.listen(0, '127.0.0.1', () => resolve(this.url(server)));
    });
  }

  async onApplicationShutdown(): Promise<void> {
    const server = this.server;
    if (server) await new Promise<void>((resolve) => server.close(resolve));
  }

  private url(server: SMTPServer): string {
    return `smtp://127.0.0.1:${(server.server.address() as AddressInfo).port}`;
  }
}

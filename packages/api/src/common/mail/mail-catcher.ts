import type { AddressInfo } from 'node:net';
import { Injectable, type OnApplicationShutdown } from '@nestjs/common';
import { type ParsedMail, simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';

const KEPT = 200;
const MAIL_MAX_BYTES = 1024 * 1024;
const CLOSE_MS = 500;

export interface CaughtMail {
  /** In order of arrival, from 1; stays the mail's own. */
  readonly number: number;
  readonly mail: ParsedMail;
}

/** Takes every mail where no SMTP_URL is set: a real server on the loopback, read at /dev/mail. */
@Injectable()
export class MailCatcher implements OnApplicationShutdown {
  /** Newest first. */
  readonly caught: CaughtMail[] = [];
  private count = 0;
  private server: SMTPServer | null = null;
  private opened: Promise<string> | null = null;

  address(): Promise<string> {
    this.opened ??= this.listen();
    return this.opened;
  }

  async onApplicationShutdown(): Promise<void> {
    const server = this.server;
    if (server) await new Promise<void>((resolve) => server.close(resolve));
  }

  private listen(): Promise<string> {
    const server = new SMTPServer({
      authOptional: true,
      disabledCommands: ['AUTH', 'STARTTLS'],
      size: MAIL_MAX_BYTES,
      closeTimeout: CLOSE_MS,
      onData: (stream, _session, done) => {
        simpleParser(stream).then(
          (mail) => {
            this.keep(mail);
            done();
          },
          (error: Error) => done(error),
        );
      },
    });
    this.server = server;
    return new Promise((resolve, reject) => {
      // Also later: a connection that breaks off is nobody's failure.
      server.on('error', reject);
      server.listen(0, '127.0.0.1', () => {
        const { port } = server.server.address() as AddressInfo;
        resolve(`smtp://127.0.0.1:${port}`);
      });
    });
  }

  private keep(mail: ParsedMail): void {
    this.count += 1;
    this.caught.unshift({ number: this.count, mail });
    if (this.caught.length > KEPT) this.caught.pop();
  }
}

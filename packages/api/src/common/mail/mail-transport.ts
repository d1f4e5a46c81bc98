import { Injectable, type OnApplicationShutdown } from '@nestjs/common';
import { createTransport, type SendMailOptions, type Transporter } from 'nodemailer';
import { Settings } from '../config/settings.js';
import { MailCatcher } from './mail-catcher.js';

/** A server that hangs is given up on, so that the rest of the outbox goes on. */
const PATIENCE_MS = 10_000;

@Injectable()
export class MailTransport implements OnApplicationShutdown {
  private transporter: Transporter | null = null;

  constructor(
    private readonly settings: Settings,
    private readonly catcher: MailCatcher,
  ) {}

  /** False in production without SMTP_URL, where mails wait. */
  get leadsSomewhere(): boolean {
    return this.settings.env.SMTP_URL !== undefined || !this.settings.production;
  }

  /** Rejects where the server does not take it. */
  async send(mail: SendMailOptions): Promise<void> {
    this.transporter ??= await this.open();
    await this.transporter.sendMail(mail);
  }

  onApplicationShutdown(): void {
    this.transporter?.close();
  }

  private async open(): Promise<Transporter> {
    return createTransport({
      url: this.settings.env.SMTP_URL ?? (await this.catcher.address()),
      connectionTimeout: PATIENCE_MS,
      greetingTimeout: PATIENCE_MS,
      socketTimeout: PATIENCE_MS,
      dnsTimeout: PATIENCE_MS,
      // A mail carries what we wrote and nothing from disk or wire.
      disableFileAccess: true,
      disableUrlAccess: true,
    } as object);
  }
}

import { Injectable, type OnApplicationShutdown } from '@nestjs/common';
import { createTransport, type Transporter } from 'nodemailer';
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

  /** Where mails go; null in production without SMTP_URL, where they wait. */
  async open(): Promise<Transporter | null> {
    if (this.transporter) return this.transporter;
    const url =
      this.settings.env.SMTP_URL ?? (this.settings.production ? null : await this.catcher.address());
    if (!url) return null;
    this.transporter = createTransport({
      url,
      connectionTimeout: PATIENCE_MS,
      greetingTimeout: PATIENCE_MS,
      socketTimeout: PATIENCE_MS,
      dnsTimeout: PATIENCE_MS,
    } as object);
    return this.transporter;
  }

  onApplicationShutdown(): void {
    this.transporter?.close();
  }
}

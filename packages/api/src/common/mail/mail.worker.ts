import { Injectable, Logger, type OnApplicationBootstrap, type OnApplicationShutdown } from '@nestjs/common';
import { PreparedReader } from '../database/prepared-reader.js';
import { Settings } from '../config/settings.js';
import { UnitOfWork } from '../database/unit-of-work.js';
import { Clock } from '../time/clock.js';
import { MailTransport } from './mail-transport.js';

interface Due {
  id: string;
  to: string;
  subject: string;
  text: string;
  html: string;
  attempts: number;
}

const DUE = `SELECT "id", "to", "subject", "text", "html", "attempts" FROM "outbox"
  WHERE "sentAt" IS NULL AND "dueAt" <= ? ORDER BY "dueAt" LIMIT 20`;
const SENT = `UPDATE "outbox" SET "sentAt" = ?, "attempts" = "attempts" + 1, "lastError" = NULL WHERE "id" = ?`;
const FAILED = `UPDATE "outbox" SET "attempts" = "attempts" + 1, "dueAt" = ?, "lastError" = ? WHERE "id" = ?`;
const LOOK_MS = 1_000;
const FIRST_WAIT_MS = 15_000;
const LONGEST_WAIT_MS = 3_600_000;

/** Sends what lies in the outbox, at least once, with back-off; outside every request. */
@Injectable()
export class MailWorker implements OnApplicationBootstrap, OnApplicationShutdown {
  private readonly logger = new Logger(MailWorker.name);
  private timer: NodeJS.Timeout | null = null;
  private round: Promise<void> | null = null;

  constructor(
    private readonly reader: PreparedReader,
    private readonly unitOfWork: UnitOfWork,
    private readonly transport: MailTransport,
    private readonly clock: Clock,
    private readonly settings: Settings,
  ) {}

  onApplicationBootstrap(): void {
    if (!this.settings.writes) return;
    this.timer = setInterval(() => void this.sendDue(), LOOK_MS);
    this.timer.unref();
  }

  async onApplicationShutdown(): Promise<void> {
    if (this.timer) clearInterval(this.timer);
    await this.round;
  }

  /** One round at a time. */
  sendDue(): Promise<void> {
    this.round ??= this.sendRound()
      .catch((error: unknown) => this.logger.error({ err: error }, 'the outbox could not be worked'))
      .finally(() => (this.round = null));
    return this.round;
  }

  private async sendRound(): Promise<void> {
    const due = this.reader.all<Due>(DUE, [this.clock.instant()]);
    for (const mail of due) await this.send(mail);
  }

  private async send({ id, to, subject, text, html, attempts }: Due): Promise<void> {
    const transporter = await this.transport.open();
    if (!transporter) return;
    const from = this.settings.env.MAIL_FROM;
    try {
      await transporter.sendMail({ from, to, subject, text, html, messageId: `<${id}@rivetside>` });
    } catch (error) {
      const wait = Math.min(FIRST_WAIT_MS * 2 ** attempts, LONGEST_WAIT_MS);
      const dueAt = new Date(this.clock.now().getTime() + wait).toISOString();
      const reason = error instanceof Error ? error.message.slice(0, 300) : 'refused';
      this.logger.warn({ mail: id, attempts: attempts + 1 }, 'a mail was not taken and waits');
      await this.unitOfWork.runPrepared((db) => void db.run(FAILED, [dueAt, reason, id]));
      return;
    }
    await this.unitOfWork.runPrepared((db) => void db.run(SENT, [this.clock.instant(), id]));
  }
}

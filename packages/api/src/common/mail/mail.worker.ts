import { Injectable, Logger, type OnApplicationBootstrap, type OnApplicationShutdown } from '@nestjs/common';
import { Settings } from '../config/settings.js';
import { PreparedReader } from '../database/prepared-reader.js';
import { UnitOfWork } from '../database/unit-of-work.js';
import { Clock } from '../time/clock.js';
import { isServerFault, later, NEVER, nextTry, restMs } from './mail-patience.js';
import { MailTransport } from './mail-transport.js';

interface Due {
  id: string;
  to: string;
  subject: string;
  text: string;
  html: string;
  attempts: number;
  createdAt: string;
}

const DUE = `SELECT "id", "to", "subject", "text", "html", "attempts", "createdAt" FROM "outbox"
  WHERE "sentAt" IS NULL AND "dueAt" <= ? ORDER BY "dueAt" LIMIT 4`;
/** What was sent is not kept: its link is a secret. */
const SENT = `UPDATE "outbox" SET "sentAt" = ?, "attempts" = "attempts" + 1, "lastError" = NULL, "text" = '', "html" = ''
  WHERE "id" = ?`;
const FAILED = `UPDATE "outbox" SET "attempts" = "attempts" + 1, "dueAt" = ?, "lastError" = ? WHERE "id" = ?`;
const LOOK_MS = 500;
const STOP_MS = 2_000;

/**
 * Sends what lies in the outbox, outside every request. At least once: whoever crashes between sending and noting it
 * sends again, under the same Message-ID.
 */
@Injectable()
export class MailWorker implements OnApplicationBootstrap, OnApplicationShutdown {
  private readonly logger = new Logger(MailWorker.name);
  private timer: NodeJS.Timeout | null = null;
  private round: Promise<void> | null = null;
  private stopping = false;
  /** How often in a row the server was not to be had, and until when it is left alone. */
  private faults = 0;
  private restUntil = 0;

  constructor(
    private readonly reader: PreparedReader,
    private readonly unitOfWork: UnitOfWork,
    private readonly transport: MailTransport,
    private readonly clock: Clock,
    private readonly settings: Settings,
  ) {}

  onApplicationBootstrap(): void {
    if (!this.settings.writes || !this.transport.leadsSomewhere) return;
    this.timer = setInterval(() => void this.sendDue(), LOOK_MS);
    this.timer.unref();
  }

  /** A server that hangs does not hold up the stop: the mail lies in the outbox still. */
  async onApplicationShutdown(): Promise<void> {
    this.stopping = true;
    if (this.timer) clearInterval(this.timer);
    let patience: NodeJS.Timeout | undefined;
    const enough = new Promise<void>((resolve) => (patience = setTimeout(resolve, STOP_MS)));
    await Promise.race([this.round, enough]);
    clearTimeout(patience);
  }

  /** One round at a time. */
  sendDue(): Promise<void> {
    this.round ??= this.sendRound()
      .catch((error: unknown) => {
        if (!this.stopping) this.logger.error({ err: error }, 'the outbox could not be worked');
      })
      .finally(() => (this.round = null));
    return this.round;
  }

  private async sendRound(): Promise<void> {
    while (!this.stopping && this.clock.now().getTime() >= this.restUntil) {
      const due = this.reader.all<Due>(DUE, [this.clock.instant()]);
      if (due.length === 0) return;
      const ends = await Promise.all(due.map((mail) => this.send(mail)));
      if (ends.every((end) => end === 'no server')) this.rest();
      else this.faults = 0;
    }
  }

  private rest(): void {
    this.faults += 1;
    this.restUntil = this.clock.now().getTime() + restMs(this.faults);
  }

  private async send(mail: Due): Promise<'sent' | 'refused' | 'no server'> {
    try {
      await this.transport.send(this.written(mail));
    } catch (error) {
      if (!this.stopping) await this.keepForLater(mail, error);
      return isServerFault(error) ? 'no server' : 'refused';
    }
    await this.unitOfWork.runPrepared((db) => void db.run(SENT, [this.clock.instant(), mail.id]));
    return 'sent';
  }

  private async keepForLater(mail: Due, error: unknown): Promise<void> {
    const now = this.clock.now();
    const reason = error instanceof Error ? error.message.slice(0, 300) : 'refused';
    // Where the server is not to be had, the mail waits for the server, behind those that have not been tried.
    const dueAt = isServerFault(error) ? later(now, restMs(this.faults + 1)) : nextTry(mail, now);
    const facts = { mail: mail.id, attempts: mail.attempts + 1 };
    if (dueAt === NEVER) this.logger.error(facts, 'a mail was refused for days and is given up');
    else this.logger.warn(facts, 'a mail was not taken and waits');
    await this.unitOfWork.runPrepared((db) => void db.run(FAILED, [dueAt, reason, mail.id]));
  }

  private written({ id, to, subject, text, html, createdAt }: Due) {
    const from = this.settings.env.MAIL_FROM;
    const domain = /@([^>\s]+)>?\s*$/.exec(from)?.[1] ?? 'rivetside';
    return {
      from,
      // As an object: as text it would be read as a list.
      to: { name: '', address: to },
      subject,
      text,
      html,
      date: createdAt,
      messageId: `<${id}@${domain}>`,
      headers: { 'Auto-Submitted': 'auto-generated' },
    };
  }
}

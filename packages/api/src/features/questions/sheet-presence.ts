import { Injectable, Logger, type OnApplicationShutdown } from '@nestjs/common';
import { Realtime } from '../../common/realtime/realtime.js';

/** Many who come at once are told of once. */
const GATHER_MS = 120;

/** Tells a sheet who is there and who is writing, a moment after it changed. */
@Injectable()
export class SheetPresence implements OnApplicationShutdown {
  private readonly logger = new Logger(SheetPresence.name);
  private readonly soon = new Map<string, NodeJS.Timeout>();
  private readonly later = new Set<NodeJS.Timeout>();

  constructor(private readonly realtime: Realtime) {}

  changed(questionId: string): void {
    if (this.soon.has(questionId)) return;
    const timer = setTimeout(() => {
      this.soon.delete(questionId);
      this.realtime
        .tellPresence(questionId)
        .catch((error: unknown) => this.logger.warn({ err: error }, 'who is at a sheet could not be told'));
    }, GATHER_MS);
    timer.unref();
    this.soon.set(questionId, timer);
  }

  /** Somebody who stops saying that they write has stopped. */
  changedLater(questionId: string, afterMs: number): void {
    const timer = setTimeout(() => {
      this.later.delete(timer);
      this.changed(questionId);
    }, afterMs);
    timer.unref();
    this.later.add(timer);
  }

  onApplicationShutdown(): void {
    for (const timer of [...this.soon.values(), ...this.later]) clearTimeout(timer);
  }
}

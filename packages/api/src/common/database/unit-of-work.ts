import { AsyncLocalStorage } from 'node:async_hooks';
import { Injectable, Logger, type OnApplicationShutdown } from '@nestjs/common';
import { EventEmitter2 } from '@nestjs/event-emitter';
import { InjectDataSource } from '@nestjs/typeorm';
import type { Database } from 'better-sqlite3';
import { DataSource, type EntityManager, type QueryRunner } from 'typeorm';
import { Settings } from '../config/settings.js';
import { ReadsOnly } from '../errors/app-error.js';
import type { DomainEvent } from '../events/domain-event.js';
import { asNobodysAnswer, keepAnswer } from '../idempotency/kept-answers.js';
import { PreparedDb } from './prepared.js';
import { rawConnection } from './raw-connection.js';

/** What a unit of work may do: read and write rows, and record what happened. */
export interface Tx {
  readonly manager: EntityManager;
  record(event: DomainEvent): void;
}

/**
 * The only way to write. Units run one after another; each is one IMMEDIATE transaction; what they recorded is
 * published after the commit and only then. Inside a unit await nothing but the database.
 */
@Injectable()
export class UnitOfWork implements OnApplicationShutdown {
  private readonly logger = new Logger(UnitOfWork.name);
  private readonly inside = new AsyncLocalStorage<true>();
  private readonly database: Database;
  private readonly prepared: PreparedDb;
  private queue: Promise<unknown> = Promise.resolve();
  private waiting = 0;

  constructor(
    @InjectDataSource() private readonly writer: DataSource,
    private readonly events: EventEmitter2,
    private readonly settings: Settings,
  ) {
    this.database = rawConnection(writer);
    this.prepared = new PreparedDb(this.database);
  }

  /** Runs with the entity manager. A throw rolls back and publishes nothing. */
  run<T>(work: (tx: Tx) => Promise<T>): Promise<T> {
    return this.next(async () => {
      const recorded: DomainEvent[] = [];
      const runner = this.begin();
      try {
        const tx: Tx = { manager: runner.manager, record: (event) => recorded.push(event) };
        const result = await this.inside.run(true, () => work(tx));
        keepAnswer(this.prepared, result);
        this.database.exec('COMMIT');
        return { result, recorded };
      } catch (error) {
        // A full disk has rolled back already.
        if (this.database.inTransaction) this.database.exec('ROLLBACK');
        throw error;
      } finally {
        setActive(runner, false);
      }
    });
  }

  /** The same queue, one synchronous transaction on prepared statements: for hot writes. */
  runPrepared<T>(work: (db: PreparedDb, record: (event: DomainEvent) => void) => T): Promise<T> {
    return this.next(() => {
      const recorded: DomainEvent[] = [];
      const transaction = this.database.transaction(() => {
        const result = this.inside.run(true, () => work(this.prepared, (event) => recorded.push(event)));
        // Its awaiting would go on after the commit, outside of any transaction.
        if (result instanceof Promise) throw new Error('A prepared unit awaits nothing.');
        keepAnswer(this.prepared, result);
        return result;
      });
      return Promise.resolve({ result: transaction.immediate(), recorded });
    });
  }

  /** A stop waits for the units that were taken in. */
  async onApplicationShutdown(): Promise<void> {
    await this.queue;
  }

  /** The write stands whatever becomes of those who are told: their trouble is not its sender's. */
  private publish(event: DomainEvent): void {
    try {
      asNobodysAnswer(() => this.events.emit(event.topic, event));
    } catch (error) {
      this.logger.error({ err: error, topic: event.topic }, 'a listener failed');
    }
  }

  private begin(): QueryRunner {
    const runner = this.writer.createQueryRunner();
    // TypeORM would begin a deferred transaction; told that one is active, it starts none of its own.
    this.database.exec('BEGIN IMMEDIATE');
    setActive(runner, true);
    return runner;
  }

  private next<T>(unit: () => Promise<{ result: T; recorded: DomainEvent[] }>): Promise<T> {
    if (!this.settings.writes) return Promise.reject(new ReadsOnly());
    // A unit that waits for another one inside it waits for itself.
    if (this.inside.getStore()) return Promise.reject(new Error('A unit of work does not open another one.'));
    // With nobody before it a unit starts at once: the turn of the event loop would cost more than the write.
    const turn = this.waiting === 0 ? startNow(unit) : this.queue.then(unit);
    this.waiting += 1;
    const settled = turn.then(
      () => undefined,
      () => undefined,
    );
    this.queue = settled;
    void settled.then(() => (this.waiting -= 1));
    return turn.then(({ result, recorded }) => {
      for (const event of recorded) this.publish(event);
      return result;
    });
  }
}

function startNow<T>(unit: () => Promise<T>): Promise<T> {
  try {
    return unit();
  } catch (error) {
    return Promise.reject(error instanceof Error ? error : new Error(String(error)));
  }
}

/** Read-only in the types; TypeORM sets it itself around the transactions that it begins. */
function setActive(runner: QueryRunner, active: boolean): void {
  (runner as { isTransactionActive: boolean }).isTransactionActive = active;
}

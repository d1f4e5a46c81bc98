import { setTimeout as wait } from 'node:timers/promises';
import { EventEmitter2 } from '@nestjs/event-emitter';
import { startTestApp, type TestApp } from '../../testing/start-test-app.js';
import { DomainEvent } from '../events/domain-event.js';
import { OutboxEntity } from '../mail/outbox.entity.js';
import { PreparedReader } from './prepared-reader.js';
import { Reader } from './reader.js';
import { UnitOfWork } from './unit-of-work.js';

class MailLaid extends DomainEvent {
  static override readonly topic = 'test.mail-laid';
  constructor(readonly id: string) {
    super();
  }
}

const mail = (id: string) => ({
  id,
  to: 'somebody@test.example',
  subject: 'A',
  text: 'B',
  html: 'C',
  createdAt: '2026-01-01T00:00:00.000Z',
  // Never due: the worker leaves it alone.
  dueAt: '9999-01-01T00:00:00.000Z',
  attempts: 0,
  sentAt: null,
  lastError: null,
});
const INSERT = `INSERT INTO "outbox" ("id", "to", "subject", "text", "html", "createdAt", "dueAt", "attempts")
  VALUES (?, 'somebody@test.example', 'A', 'B', 'C', '2026-01-01T00:00:00.000Z', '9999-01-01T00:00:00.000Z', 0)`;

describe('UnitOfWork', () => {
  let test: TestApp;
  let units: UnitOfWork;
  let reader: PreparedReader;
  let heard: string[];
  beforeAll(async () => {
    test = await startTestApp();
    units = test.app.get(UnitOfWork);
    reader = test.app.get(PreparedReader);
    test.app.get(EventEmitter2).on(MailLaid.topic, ({ id }: MailLaid) => heard.push(id));
  });
  afterAll(() => test.stop());
  beforeEach(async () => {
    heard = [];
    await units.runPrepared((db) => void db.run('DELETE FROM "outbox"'));
  });
  const kept = () =>
    reader.all<{ id: string }>('SELECT "id" FROM "outbox" ORDER BY "id"').map(({ id }) => id);

  it('runs one unit after another, in the order in which they came', async () => {
    const steps: string[] = [];
    const slow = (name: string, ms: number) =>
      units.run(async (tx) => {
        steps.push(`${name} begins`);
        await tx.manager.insert(OutboxEntity, mail(name));
        await wait(ms);
        steps.push(`${name} ends`);
      });
    const prepared = units.runPrepared((db) => {
      steps.push('0 at once');
      db.run(INSERT, ['0']);
    });
    await Promise.all([prepared, slow('a', 20), slow('b', 1), units.runPrepared(() => void steps.push('c'))]);
    expect(steps).toEqual(['0 at once', 'a begins', 'a ends', 'b begins', 'b ends', 'c']);
    expect(kept()).toEqual(['0', 'a', 'b']);
  });

  it('takes back its own rows and nobody else’s', async () => {
    const units100 = Array.from({ length: 100 }, (_, at) => {
      const id = String(at).padStart(3, '0');
      const fails = at % 3 === 0;
      if (at % 2 === 0)
        return units.runPrepared((db) => {
          db.run(INSERT, [id]);
          if (fails) throw new Error('taken back');
        });
      return units.run(async (tx) => {
        await tx.manager.insert(OutboxEntity, mail(id));
        await wait(at % 5 === 0 ? 2 : 0);
        if (fails) throw new Error('taken back');
      });
    });
    const outcomes = await Promise.allSettled(units100);
    const told = outcomes.flatMap(({ status }, at) =>
      status === 'fulfilled' ? String(at).padStart(3, '0') : [],
    );
    expect(told).toHaveLength(66);
    expect(kept()).toEqual(told);
  });

  it('shows nothing to readers before the commit', async () => {
    let seenInside: string[] | null = null;
    await units.run(async (tx) => {
      await tx.manager.insert(OutboxEntity, mail('a'));
      seenInside = [
        ...kept(),
        ...(await test.app.get(Reader).manager.find(OutboxEntity)).map(({ id }) => id),
      ];
    });
    expect(seenInside).toEqual([]);
    expect(kept()).toEqual(['a']);
  });

  it('publishes what was recorded after the commit, in order', async () => {
    let heardInside = -1;
    await units.run(async (tx) => {
      await tx.manager.insert(OutboxEntity, mail('a'));
      tx.record(new MailLaid('first'));
      tx.record(new MailLaid('second'));
      heardInside = heard.length;
    });
    expect(heardInside).toBe(0);
    expect(heard).toEqual(['first', 'second']);
  });

  it('publishes nothing of what was taken back', async () => {
    const failed = units.run((tx) => {
      tx.record(new MailLaid('never'));
      return Promise.reject(new Error('taken back'));
    });
    await expect(failed).rejects.toThrow('taken back');
    const alsoFailed = units.runPrepared((_db, record) => {
      record(new MailLaid('never'));
      throw new Error('taken back');
    });
    await expect(alsoFailed).rejects.toThrow('taken back');
    expect(heard).toEqual([]);
  });

  it('stands even where a listener fails', async () => {
    const fail = () => {
      throw new Error('a listener');
    };
    test.app.get(EventEmitter2).prependListener(MailLaid.topic, fail);
    await units.runPrepared((db, record) => {
      db.run(INSERT, ['a']);
      record(new MailLaid('a'));
    });
    test.app.get(EventEmitter2).off(MailLaid.topic, fail);
    expect(kept()).toEqual(['a']);
  });

  it.each(['run', 'runPrepared'])('refuses %s inside a unit and takes the whole back', async (inner) => {
    const nested = units.run(async (tx) => {
      await tx.manager.insert(OutboxEntity, mail('a'));
      await (inner === 'run' ? units.run(() => Promise.resolve()) : units.runPrepared(() => undefined));
    });
    await expect(nested).rejects.toThrow('does not open another');
    expect(kept()).toEqual([]);
  });

  it('refuses a unit inside a prepared one', async () => {
    let inner: Promise<unknown> = Promise.resolve();
    await units.runPrepared((db) => {
      db.run(INSERT, ['a']);
      inner = units.runPrepared((within) => void within.run(INSERT, ['b']));
      inner.catch(() => undefined);
    });
    await expect(inner).rejects.toThrow('does not open another');
    expect(kept()).toEqual(['a']);
  });

  it('refuses to await inside a prepared unit', async () => {
    const awaiting = units.runPrepared(async (db) => {
      db.run(INSERT, ['a']);
      await wait(1);
    });
    await expect(awaiting).rejects.toThrow('awaits nothing');
    expect(kept()).toEqual([]);
  });

  it('goes on after a disk that was full, and readers never notice', async () => {
    await units.runPrepared((db) => void db.run(INSERT, ['before']));
    const { page_count: pages } = reader.get<{ page_count: number }>('PRAGMA page_count')!;
    const allow = (most: number) => units.runPrepared((db) => void db.all(`PRAGMA max_page_count = ${most}`));
    await allow(pages);

    const much = units.runPrepared((db) => {
      for (let at = 0; at < 2_000; at += 1) db.run(INSERT, [`full ${at} ${'x'.repeat(500)}`]);
    });
    await expect(much).rejects.toThrow('database or disk is full');
    const muchByEntities = units.run(async (tx) => {
      for (let at = 0; at < 300; at += 1)
        await tx.manager.insert(OutboxEntity, mail(`full ${at} ${'x'.repeat(4_000)}`));
    });
    await expect(muchByEntities).rejects.toThrow('database or disk is full');
    expect(kept()).toEqual(['before']);

    await allow(1_000_000);
    await units.run(async (tx) => void (await tx.manager.insert(OutboxEntity, mail('after'))));
    expect(kept()).toEqual(['after', 'before']);
  });

  it('keeps the pragmas that durability rests on', async () => {
    const writerSays = await units.runPrepared((db) =>
      ['journal_mode', 'synchronous', 'foreign_keys', 'busy_timeout', 'temp_store'].map(
        (name) => Object.values(db.get<Record<string, unknown>>(`PRAGMA ${name}`)!)[0],
      ),
    );
    // synchronous 2 is FULL, temp_store 2 is MEMORY
    expect(writerSays).toEqual(['wal', 2, 1, 5_000, 2]);
  });

  it('leaves the reader unable to write', () => {
    expect(() => reader.all('DELETE FROM "outbox" RETURNING "id"')).toThrow(/readonly/);
  });
});

import { setTimeout as wait } from 'node:timers/promises';
import { Body, Controller, Delete, HttpCode, Injectable, Module, Post, Req } from '@nestjs/common';
import { OnEvent } from '@nestjs/event-emitter';
import type { Actor as ActorType } from '@rivetside/shared';
import type { FastifyRequest } from 'fastify';
import type { TestUser } from '../../testing/create-account.js';
import { startTestApp, type TestApp } from '../../testing/start-test-app.js';
import { Access, Actor } from '../access/access.decorator.js';
import { PreparedReader } from '../database/prepared-reader.js';
import { UnitOfWork } from '../database/unit-of-work.js';
import { NotAllowed } from '../errors/app-error.js';
import { DomainEvent } from '../events/domain-event.js';
import { newId } from '../ids.js';
import { IdempotencyJob } from './idempotency.job.js';

const HOUR = 3_600_000;
const LAY = `INSERT INTO "outbox" ("id", "to", "subject", "text", "html", "createdAt", "dueAt", "attempts")
  VALUES (?, ?, 'A', 'B', 'C', '2026-01-01T00:00:00.000Z', '9999-01-01T00:00:00.000Z', 0)`;

class Laid extends DomainEvent {
  static override readonly topic = 'trial.laid';
}
interface Order {
  readonly what: string;
  readonly failing?: 'before' | 'inside' | 'after';
  readonly ms?: number;
}

/** Lays a row for each order that is carried out: doing one twice shows. */
@Injectable()
@Controller('orders')
class OrdersController {
  constructor(private readonly units: UnitOfWork) {}

  @Post()
  @Access('authenticated')
  async order(@Actor() actor: ActorType, @Body() { what, failing, ms = 0 }: Order) {
    if (failing === 'before') throw new NotAllowed('Before.');
    await wait(ms);
    const id = await this.units.run(async (tx) => {
      await tx.manager.query(LAY, [newId(), `${actor.id} ${what}`]);
      tx.record(new Laid());
      if (failing === 'inside') throw new NotAllowed('Inside.');
      return newId();
    });
    if (failing === 'after') throw new NotAllowed('After.');
    return { id, what };
  }

  @Post('prepared')
  @HttpCode(202)
  @Access('authenticated')
  prepared(@Actor() actor: ActorType, @Body() { what }: Order) {
    return this.units.runPrepared((db) => {
      db.run(LAY, [newId(), `${actor.id} ${what}`]);
      return { id: newId() };
    });
  }

  @Post('upload')
  @Access('authenticated')
  async upload(@Actor() actor: ActorType, @Req() request: FastifyRequest) {
    const file = await (request as unknown as { file(): Promise<{ toBuffer(): Promise<Buffer> }> }).file();
    const { length } = await file.toBuffer();
    return this.units.runPrepared((db) => {
      db.run(LAY, [newId(), `${actor.id} upload`]);
      return { id: newId(), length };
    });
  }

  @Delete()
  @HttpCode(204)
  @Access('authenticated')
  async discard(@Actor() actor: ActorType) {
    await this.units.runPrepared((db) => void db.run(LAY, [newId(), `${actor.id} discard`]));
  }

  /** What others do on hearing of it is not its answer. */
  @OnEvent(Laid.topic)
  async onLaid() {
    await this.units.runPrepared(() => 'the answer of a listener');
  }
}

@Module({ controllers: [OrdersController] })
class OrdersModule {}

describe('an Idempotency-Key', () => {
  let test: TestApp;
  let somebody: TestUser;
  beforeAll(async () => {
    test = await startTestApp({ modules: [OrdersModule] });
  });
  afterAll(() => test.stop());
  beforeEach(async () => {
    somebody = await test.create.user();
  });

  const send = (order: Order, key: string, path = '/orders', by = somebody) =>
    test.as(by).post(path).set('Idempotency-Key', key).send(order);
  const laid = (by = somebody) =>
    test.app
      .get(PreparedReader)
      .get<{ n: number }>(`SELECT count(*) AS "n" FROM "outbox" WHERE "to" LIKE ?`, [`${by.id} %`])!.n;

  it('that nobody could have meant is refused', async () => {
    for (const key of ['x'.repeat(201), 'with space', 'ü']) await send({ what: 'a' }, key).expect(400);
    expect(laid()).toBe(0);
  });

  it('is not needed', async () => {
    await test.as(somebody).post('/orders').send({ what: 'a' }).expect(201);
    await test.as(somebody).post('/orders').send({ what: 'a' }).expect(201);
    expect(laid()).toBe(2);
  });

  it('gives the first answer again and does it once', async () => {
    const first = await send({ what: 'a' }, 'k1').expect(201);
    const again = await send({ what: 'a' }, 'k1').expect(201);
    expect(again.body).toEqual(first.body);
    expect(first.headers['idempotency-replayed']).toBeUndefined();
    expect(again.headers['idempotency-replayed']).toBe('true');
    expect(laid()).toBe(1);
  });

  it('gives the first answer to those who come while it is under way', async () => {
    const answers = await Promise.all([1, 2, 3, 4, 5].map(() => send({ what: 'a', ms: 30 }, 'k2')));
    expect(new Set(answers.map(({ text }) => text)).size).toBe(1);
    expect(answers.map(({ status }) => status)).toEqual([201, 201, 201, 201, 201]);
    expect(laid()).toBe(1);
  });

  it('gives it with a prepared unit and a status of its own, too', async () => {
    const first = await send({ what: 'a' }, 'k3', '/orders/prepared').expect(202);
    const again = await send({ what: 'a' }, 'k3', '/orders/prepared').expect(202);
    expect(again.body).toEqual(first.body);
    expect(laid()).toBe(1);
  });

  it('gives an answer without a body again', async () => {
    const discard = () => test.as(somebody).delete('/orders').set('Idempotency-Key', 'k4');
    await discard().expect(204);
    expect((await discard().expect(204)).text).toBe('');
    expect(laid()).toBe(1);
  });

  it('with another body is a conflict', async () => {
    await send({ what: 'a' }, 'k5').expect(201);
    const { body } = await send({ what: 'b' }, 'k5').expect(409);
    expect(body).toMatchObject({ status: 409, detail: 'This Idempotency-Key was used for another request.' });
    expect(laid()).toBe(1);
  });

  it('at another address is a conflict', async () => {
    await send({ what: 'a' }, 'k6').expect(201);
    await send({ what: 'a' }, 'k6', '/orders/prepared').expect(409);
    expect(laid()).toBe(1);
  });

  it('of somebody else is another key', async () => {
    const other = await test.create.user();
    const first = await send({ what: 'a' }, 'k7').expect(201);
    const others = await send({ what: 'a' }, 'k7', '/orders', other).expect(201);
    expect(others.body.id).not.toBe(first.body.id);
    expect([laid(), laid(other)]).toEqual([1, 1]);
  });

  it.each(['before', 'inside'] as const)(
    'of what was refused %s anything was written may be tried again',
    async (failing) => {
      await send({ what: 'a', failing }, `k8 ${failing}`.replace(' ', '-')).expect(403);
      await send({ what: 'a' }, `k8-${failing}`).expect(201);
      expect(laid()).toBe(1);
    },
  );

  it('of what was refused after something was written gives the refusal again', async () => {
    const first = await send({ what: 'a', failing: 'after' }, 'k9').expect(403);
    const again = await send({ what: 'a', failing: 'after' }, 'k9').expect(403);
    expect(again.body).toEqual(first.body);
    expect(again.headers['content-type']).toContain('application/problem+json');
    expect(laid()).toBe(1);
  });

  it('holds for an upload of the same length', async () => {
    const upload = (bytes: string) =>
      test
        .as(somebody)
        .post('/orders/upload')
        .set('Idempotency-Key', 'k10')
        .attach('file', Buffer.from(bytes), 'a.jpg');
    const first = await upload('a photo').expect(201);
    expect((await upload('a photo').expect(201)).body).toEqual(first.body);
    await upload('another photo').expect(409);
    expect(laid()).toBe(1);
  });

  it('is forgotten after a day', async () => {
    await send({ what: 'a' }, 'k11').expect(201);
    test.clock.advance(23 * HOUR);
    await test.app.get(IdempotencyJob).forgetOld();
    await send({ what: 'a' }, 'k11').expect(201);
    expect(laid()).toBe(1);
    test.clock.advance(2 * HOUR);
    await send({ what: 'b' }, 'k11').expect(201);
    await send({ what: 'b' }, 'k11').expect(201);
    expect(laid()).toBe(2);
    test.clock.advance(25 * HOUR);
    await test.app.get(IdempotencyJob).forgetOld();
    const left = test.app
      .get(PreparedReader)
      .get<{ n: number }>('SELECT count(*) AS "n" FROM "idempotency_keys"');
    expect(left).toEqual({ n: 0 });
  });
});

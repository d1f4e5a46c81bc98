// The built app with one route more, for killing it: each order lays one row, so that a lost or a doubled one shows.
import 'reflect-metadata';
import { Body, Controller, Inject, Module, Post } from '@nestjs/common';
import { Access, Actor } from '../dist/common/access/access.decorator.js';
import { AccessTokens } from '../dist/common/access/access-tokens.js';
import { readEnv } from '../dist/common/config/env.js';
import { Settings } from '../dist/common/config/settings.js';
import { UnitOfWork } from '../dist/common/database/unit-of-work.js';
import { newId } from '../dist/common/ids.js';
import { createApp } from '../dist/create-app.js';

const LAY = `INSERT INTO "outbox" ("id", "to", "subject", "text", "html", "createdAt", "dueAt", "attempts")
  VALUES (?, ?, 'A', 'B', 'C', '2026-01-01T00:00:00.000Z', '9999-01-01T00:00:00.000Z', 0)`;
const PERSON = `INSERT OR IGNORE INTO "users" ("id", "email", "name", "passwordHash", "emailConfirmedAt", "units", "zone", "createdAt")
  VALUES ('u', 'u@test.example', 'U', '-', '2026-01-01', 'inch', 'Europe/London', '2026-01-01')`;
const SESSION = `INSERT OR IGNORE INTO "sessions" ("id", "userId", "device", "createdAt", "lastUsedAt")
  VALUES ('s', 'u', 'test', '2026-01-01', '2026-01-01')`;

class Tallies {
  constructor(units) {
    this.units = units;
  }

  /** Every other one by the entity manager, so that both kinds of unit are cut off. */
  async lay(_actor, { order }) {
    const answer = { id: newId(), order };
    if (order % 2 === 0)
      return this.units.run(async (tx) => {
        await tx.manager.query(LAY, [newId(), `order ${order}`]);
        return answer;
      });
    return this.units.runPrepared((db) => {
      db.run(LAY, [newId(), `order ${order}`]);
      return answer;
    });
  }
}
const handler = Object.getOwnPropertyDescriptor(Tallies.prototype, 'lay');
Inject(UnitOfWork)(Tallies, undefined, 0);
Controller('tallies')(Tallies);
Post()(Tallies.prototype, 'lay', handler);
Access('authenticated')(Tallies.prototype, 'lay', handler);
Actor()(Tallies.prototype, 'lay', 0);
Body()(Tallies.prototype, 'lay', 1);

class TalliesModule {}
Module({ controllers: [Tallies] })(TalliesModule);

const app = await createApp(new Settings(readEnv(process.env)), { modules: [TalliesModule] });
await app.listen(0, '127.0.0.1');
await app.get(UnitOfWork).runPrepared((db) => {
  db.run(PERSON);
  db.run(SESSION);
});
process.send({ url: await app.getUrl(), token: app.get(AccessTokens).issue('u', 's') });

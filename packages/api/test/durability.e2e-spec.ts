import { type ChildProcess, fork } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import Database from 'better-sqlite3';
import { buildServer } from './build-server.js';

interface Running {
  readonly child: ChildProcess;
  readonly url: string;
  readonly token: string;
}
interface Answer {
  readonly id: string;
  readonly order: number;
}

const ROUNDS = 4;
const SENDERS = 8;
const LIVED_MS = [120, 260, 400, 550];

describe('a process that is killed', () => {
  const folder = mkdtempSync(join(tmpdir(), 'rivetside-kill-'));
  let running: Running | null = null;
  beforeAll(buildServer, 180_000);
  afterAll(() => {
    running?.child.kill('SIGKILL');
    rmSync(folder, { recursive: true, force: true });
  });

  async function start(): Promise<Running> {
    const env = {
      ...process.env,
      NODE_ENV: 'test',
      DATA_DIR: folder,
      DEMO: '0',
      PORT: '0',
      LOG_LEVEL: 'silent',
    };
    const child = fork(join(__dirname, 'tally-app.mjs'), { env, execArgv: [] });
    const [ready] = (await once(child, 'message')) as [{ url: string; token: string }];
    return { child, ...ready };
  }

  async function send({ url, token }: Running, order: number): Promise<Answer> {
    const response = await fetch(`${url}/api/tallies`, {
      method: 'POST',
      headers: {
        authorization: `Bearer ${token}`,
        'content-type': 'application/json',
        'idempotency-key': `order-${order}`,
      },
      body: JSON.stringify({ order }),
    });
    expect(response.status).toBe(201);
    return (await response.json()) as Answer;
  }

  it('has lost nothing that it acknowledged and doubles nothing that is sent again', async () => {
    const acknowledged = new Map<number, Answer>();
    const sent = new Set<number>();
    let next = 0;
    for (let round = 0; round < ROUNDS; round += 1) {
      const now = (running = await start());
      const gone = once(now.child, 'exit');
      const sender = async () => {
        for (;;) {
          const order = (next += 1);
          sent.add(order);
          acknowledged.set(order, await send(now, order));
        }
      };
      const senders = Array.from({ length: SENDERS }, sender);
      setTimeout(() => now.child.kill('SIGKILL'), LIVED_MS[round]);
      await Promise.all([gone, Promise.allSettled(senders)]);
    }
    expect(acknowledged.size).toBeGreaterThan(ROUNDS * SENDERS);
    expect(sent.size).toBeGreaterThan(acknowledged.size);

    running = await start();
    for (const order of sent) {
      const answer = await send(running, order);
      if (acknowledged.has(order)) expect(answer).toEqual(acknowledged.get(order));
    }
    running.child.kill('SIGKILL');
    await once(running.child, 'exit');

    const database = new Database(join(folder, 'rivetside.sqlite'), { readonly: true });
    expect(database.pragma('integrity_check')).toEqual([{ integrity_check: 'ok' }]);
    expect(database.pragma('foreign_key_check')).toEqual([]);
    const rows = database.prepare('SELECT "to" FROM "outbox"').all() as { to: string }[];
    database.close();
    expect(rows.map(({ to }) => to).sort()).toEqual([...sent].map((order) => `order ${order}`).sort());
  }, 120_000);
});

import 'reflect-metadata';
import { mkdtempSync, rmSync } from 'node:fs';
import type { Server } from 'node:http';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { NestFastifyApplication } from '@nestjs/platform-fastify';
import { PinoLogger } from 'nestjs-pino';
import supertest, { type Test } from 'supertest';
import { AccessTokens } from '../common/access/access-tokens.js';
import { readEnv } from '../common/config/env.js';
import { Settings } from '../common/config/settings.js';
import { UnitOfWork } from '../common/database/unit-of-work.js';
import { createApp } from '../create-app.js';
import { CreateQuestion } from './create-question.js';
import { TestClock } from './test-clock.js';

type Method = 'get' | 'post' | 'put' | 'patch' | 'delete';
/** Paths are those below `/api`. */
export type TestClient = Readonly<Record<Method, (path: string) => Test>>;

export interface TestApp {
  readonly app: NestFastifyApplication;
  readonly server: Server;
  readonly settings: Settings;
  readonly clock: TestClock;
  readonly create: CreateQuestion;
  readonly guest: TestClient;
  /** Somebody signed in; made by `create.user`. */
  as(user: { readonly id: string; readonly sessionId: string }): TestClient;
  /** The access token that `as` sends, for sockets. */
  tokenOf(user: { readonly id: string; readonly sessionId: string }): string;
  stop(): Promise<void>;
}

export interface TestAppOptions {
  readonly env?: Readonly<Record<string, string>>;
  readonly webRoot?: string;
  /** Modules with routes of the test's own. */
  readonly modules?: readonly (new () => object)[];
  /** Hears the log; LOG_LEVEL is silent unless set. */
  readonly log?: { write(line: string): void };
}

/** The whole app with its real migrations on a SQLite file of its own, listening on a free port. */
export async function startTestApp({ env = {}, ...parts }: TestAppOptions = {}): Promise<TestApp> {
  const dataDir = mkdtempSync(join(tmpdir(), 'rivetside-test-'));
  const defaults = { NODE_ENV: 'test', PORT: '0', DATA_DIR: dataDir, DEMO: '0', LOG_LEVEL: 'silent' };
  const settings = new Settings(readEnv({ ...defaults, ...env }));
  const clock = new TestClock();
  // The logger is one for the whole process: a second app would keep the level of the first.
  if (PinoLogger.root) PinoLogger.root.level = settings.env.LOG_LEVEL;
  const app = await createApp(settings, { ...parts, clock });
  await app.listen(0, '127.0.0.1');
  const server = app.getHttpServer() as unknown as Server;
  const tokenOf = (user: { id: string; sessionId: string }) =>
    app.get(AccessTokens).issue(user.id, user.sessionId);

  const as = (user: { id: string; sessionId: string }) => clientOf(server, tokenOf(user));

  return {
    app,
    server,
    settings,
    clock,
    create: new CreateQuestion(app.get(UnitOfWork), clock, as),
    guest: clientOf(server, null),
    as,
    tokenOf,
    stop: async () => {
      await app.close();
      rmSync(dataDir, { recursive: true, force: true });
    },
  };
}

function clientOf(server: Server, token: string | null): TestClient {
  const send = (method: Method) => (path: string) => {
    const request = supertest(server)[method](`/api${path}`);
    return token === null ? request : request.set('authorization', `Bearer ${token}`);
  };
  return {
    get: send('get'),
    post: send('post'),
    put: send('put'),
    patch: send('patch'),
    delete: send('delete'),
  };
}

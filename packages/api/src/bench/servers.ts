import { type ChildProcess, fork } from 'node:child_process';
import { createSecretKey } from 'node:crypto';
import { fileURLToPath } from 'node:url';
import { JwtService } from '@nestjs/jwt';
import {
  AccessTokens,
  TOKEN_ALGORITHM,
  TOKEN_AUDIENCE,
  TOKEN_ISSUER,
} from '../common/access/access-tokens.js';
import { benchEnv, type BenchWorld } from './seed.js';

export interface Measured {
  readonly name: 'app' | 'bare';
  readonly url: string;
  stop(): Promise<void>;
}

const dist = (file: string) => fileURLToPath(new URL(`../${file}`, import.meta.url));

function started(child: ChildProcess): Promise<{ port?: number; listening?: string }> {
  return new Promise((resolve, reject) => {
    child.once('message', (said) => resolve(said as { port?: number; listening?: string }));
    child.once('exit', (code) => reject(new Error(`a server ended with ${code} before it listened`)));
  });
}

function measured(name: Measured['name'], url: string, child: ChildProcess): Measured {
  return {
    name,
    url,
    stop: () =>
      new Promise((resolve) => {
        child.once('exit', () => resolve());
        child.kill('SIGTERM');
      }),
  };
}

export async function startBare({ databaseFile, userId, chapterId, kitId }: BenchWorld): Promise<Measured> {
  const facts = { BENCH_FILE: databaseFile, BENCH_USER: userId, BENCH_CHAPTER: chapterId, BENCH_KIT: kitId };
  const child = fork(dist('bench/bare-server.js'), { env: { ...process.env, ...facts } });
  const { port } = await started(child);
  return measured('bare', `http://127.0.0.1:${port}`, child);
}

export async function startApp({ dataDir }: BenchWorld): Promise<Measured> {
  const child = fork(dist('main.js'), {
    env: { ...process.env, ...benchEnv(dataDir), PORT: '0', HOST: '127.0.0.1' },
  });
  const { listening } = await started(child);
  return measured('app', listening!, child);
}

/** As the app signs it; made anew as often as wanted, for a measurement outlives a token. */
export function tokenFor({ dataDir, userId, sessionId }: BenchWorld): string {
  const secret = createSecretKey(benchEnv(dataDir).JWT_SECRET, 'utf8');
  const signOptions = {
    algorithm: TOKEN_ALGORITHM,
    issuer: TOKEN_ISSUER,
    audience: TOKEN_AUDIENCE,
    expiresIn: 900,
  } as const;
  return new AccessTokens(new JwtService({ secret, signOptions } as never)).issue(userId, sessionId);
}

import autocannon from 'autocannon';
import type { Measured } from './servers.js';
import type { BenchWorld } from './seed.js';
import { tokenFor } from './servers.js';

export interface Route {
  readonly name: string;
  readonly method: 'GET' | 'POST';
  /** Address of the nth request. */
  path(world: BenchWorld, turn: number): string;
  readonly body?: string;
}

const some = ({ questionIds }: BenchWorld, turn: number) => questionIds[(turn * 7_919) % questionIds.length]!;
/** Words of different rarity, as people type them. */
const SOUGHT = ['0.387 AD6', 'nutplate gap', 'crack bend web', 'AD4 edge', 'shop head'];

export const ROUTES = {
  list: { name: 'list', method: 'GET', path: () => '/api/questions' },
  sheet: { name: 'thread', method: 'GET', path: (world, turn) => `/api/questions/${some(world, turn)}` },
  search: {
    name: 'search',
    method: 'GET',
    path: (_, turn) => `/api/search?q=${encodeURIComponent(SOUGHT[turn % SOUGHT.length]!)}`,
  },
  post: {
    name: 'post',
    method: 'POST',
    path: (world, turn) => `/api/questions/${some(world, turn % 500)}/messages`,
    body: JSON.stringify({ body: 'The edge measures 0.31 with the caliper.' }),
  },
} as const satisfies Record<string, Route>;

const CONNECTIONS = 8;
const REQUESTS = 200;

/** Requests a second over so many seconds; throws when an answer was not of the 200s. */
export async function throughput(
  world: BenchWorld,
  server: Measured,
  route: Route,
  seconds: number,
): Promise<number> {
  const headers = { authorization: `Bearer ${tokenFor(world)}`, 'content-type': 'application/json' };
  const requests = Array.from({ length: REQUESTS }, (_, turn) => ({
    method: route.method,
    path: route.path(world, turn),
    headers,
    ...(route.body ? { body: route.body } : {}),
  }));
  const result = await autocannon({ url: server.url, connections: CONNECTIONS, duration: seconds, requests });
  if (result.non2xx > 0 || result.errors > 0)
    throw new Error(`${server.name} ${route.name}: ${result.non2xx} refused, ${result.errors} failed`);
  return result.requests.average;
}

export function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.floor(sorted.length / 2)]!;
}

import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fanOut } from './fan-out.js';
import { median, type Route, ROUTES, throughput } from './load.js';
import { type BenchWorld, seedBench } from './seed.js';
import { type Measured, startApp, startBare } from './servers.js';

/** Rounds alternate between the two servers: what else the machine does falls on both. */
const ROUNDS = Number(process.env['BENCH_ROUNDS'] ?? 5);
const SECONDS = Number(process.env['BENCH_SECONDS'] ?? 3);
const QUESTIONS = Number(process.env['BENCH_QUESTIONS'] ?? 100_000);
const POSTS = 40;
const GOALS = { list: 0.65, sheet: 0.75, search: 0.9, post: 0.5 } as const;
const FAN_OUT_GOAL = 1.3;
const GROWTH_GOAL = 1.2;

const say = (line: string) => console.log(line);
const folders: string[] = [];

async function seeded(questions: number, events: number): Promise<BenchWorld> {
  const dataDir = mkdtempSync(join(tmpdir(), 'rivetside-bench-'));
  folders.push(dataDir);
  say(`Filling a database with ${questions} questions and ${events} events …`);
  return seedBench(dataDir, questions, events);
}

async function compare(
  world: BenchWorld,
  servers: readonly Measured[],
  route: Route,
): Promise<Record<string, number>> {
  const rates: Record<string, number[]> = {};
  for (const server of servers) await throughput(world, server, route, 1);
  for (let round = 0; round < ROUNDS; round += 1)
    for (const server of servers)
      (rates[server.name] ??= []).push(await throughput(world, server, route, SECONDS));
  return Object.fromEntries(Object.entries(rates).map(([name, values]) => [name, median(values)]));
}

function verdict(met: boolean): string {
  return met ? 'met' : 'NOT MET';
}

async function againstBare(): Promise<void> {
  const world = await seeded(QUESTIONS, QUESTIONS * 5);
  const servers = [await startApp(world), await startBare(world)];
  for (const [name, goal] of Object.entries(GOALS)) {
    const route = ROUTES[name as keyof typeof GOALS];
    const { app = 0, bare = 1 } = await compare(world, servers, route);
    const ratio = app / bare;
    const rates = `${app.toFixed(0)}/s against ${bare.toFixed(0)}/s`;
    say(`${route.name.padEnd(8)} ${ratio.toFixed(2)}  (goal ≥ ${goal}: ${verdict(ratio >= goal)})  ${rates}`);
  }
  const heard: Record<string, { p50: number; p99: number }[]> = {};
  for (let round = 0; round < 3; round += 1)
    for (const server of servers) (heard[server.name] ??= []).push(await fanOut(world, server, POSTS));
  const p99 = (name: string) => median(heard[name]!.map((one) => one.p99));
  const ratio = p99('app') / p99('bare');
  const times = `${p99('app').toFixed(1)} ms against ${p99('bare').toFixed(1)} ms at 1,000 clients`;
  say(
    `fan-out  ${ratio.toFixed(2)}  (goal ≤ ${FAN_OUT_GOAL}: ${verdict(ratio <= FAN_OUT_GOAL)})  p99 ${times}`,
  );
  for (const server of servers) await server.stop();
}

/** What a sheet costs must not grow with all that others have written. */
async function againstItself(): Promise<void> {
  const small = await seeded(2_000, 10_000);
  const large = await seeded(200_000, 1_000_000);
  const apps = [await startApp(small), await startApp(large)] as const;
  for (const route of [ROUTES.sheet, ROUTES.list, ROUTES.post]) {
    const rates = { small: [] as number[], large: [] as number[] };
    for (const [at, world] of [small, large].entries()) await throughput(world, apps[at]!, route, 1);
    for (let round = 0; round < ROUNDS; round += 1) {
      rates.small.push(await throughput(small, apps[0], route, SECONDS));
      rates.large.push(await throughput(large, apps[1], route, SECONDS));
    }
    const ratio = median(rates.small) / median(rates.large);
    say(
      `${route.name.padEnd(8)} costs ${ratio.toFixed(2)} times as much at 1,000,000 events as at 10,000` +
        (route === ROUTES.sheet ? `  (goal ≤ ${GROWTH_GOAL}: ${verdict(ratio <= GROWTH_GOAL)})` : ''),
    );
  }
  for (const app of apps) await app.stop();
}

try {
  await againstBare();
  await againstItself();
} finally {
  for (const folder of folders) rmSync(folder, { recursive: true, force: true });
}

import { WebSocket } from 'ws';
import type { BenchWorld } from './seed.js';
import { type Measured, tokenFor } from './servers.js';

const CLIENTS = 1_000;
const AT_ONCE = 50;

/** The same plain client on both sides: what is compared is the server, not a client library. */
interface Listener {
  open(socket: WebSocket, ready: () => void): void;
  /** Whether this message is the event that was posted. */
  isEvent(text: string): boolean;
  readonly path: string;
}

const bare: Listener = { path: '/', open: (_, ready) => ready(), isEvent: () => true };

/** socket.io by hand: open, join the namespace, join the sheet, answer pings. */
function ours(token: string, questionId: string): Listener {
  return {
    path: '/socket.io/?EIO=4&transport=websocket',
    open(socket, ready) {
      socket.on('message', (raw: Buffer) => {
        const text = raw.toString();
        if (text.startsWith('0')) socket.send(`40/live,${JSON.stringify({ token })}`);
        else if (text === '2') socket.send('3');
        else if (text.startsWith('40/live'))
          socket.send(`42/live,1${JSON.stringify(['sheet:join', { questionId, afterSeq: 1_000_000 }])}`);
        else if (text.startsWith('43/live,1')) ready();
      });
    },
    isEvent: (text) => text.startsWith('42/live,["sheet:event"'),
  };
}

async function connect(url: string, listener: Listener, heard: (at: number) => void): Promise<WebSocket> {
  const socket = new WebSocket(`${url.replace('http', 'ws')}${listener.path}`, { perMessageDeflate: false });
  socket.on('message', (raw: Buffer) => listener.isEvent(raw.toString()) && heard(performance.now()));
  await new Promise<void>((resolve, reject) => {
    socket.once('error', reject);
    if (listener === bare) socket.once('open', () => resolve());
    else listener.open(socket, resolve);
  });
  return socket;
}

/** Milliseconds from the sending of a message until so many of a hundred clients have heard it. */
export async function fanOut(
  world: BenchWorld,
  server: Measured,
  posts: number,
): Promise<{ p50: number; p99: number }> {
  const questionId = world.questionIds[0]!;
  const token = tokenFor(world);
  const listener = server.name === 'app' ? ours(token, questionId) : bare;
  let took: number[] = [];
  let sentAt = 0;
  let all: () => void = () => undefined;
  const heard = (at: number) => {
    took.push(at - sentAt);
    if (took.length === CLIENTS) all();
  };
  const sockets: WebSocket[] = [];
  while (sockets.length < CLIENTS)
    sockets.push(
      ...(await Promise.all(Array.from({ length: AT_ONCE }, () => connect(server.url, listener, heard)))),
    );
  const rounds: { p50: number; p99: number }[] = [];
  for (let post = 0; post < posts; post += 1) {
    took = [];
    const done = new Promise<void>((resolve) => (all = resolve));
    sentAt = performance.now();
    await fetch(`${server.url}/api/questions/${questionId}/messages`, {
      method: 'POST',
      headers: { authorization: `Bearer ${token}`, 'content-type': 'application/json' },
      body: JSON.stringify({ body: 'Heard by everybody at the sheet.' }),
    });
    await done;
    const sorted = took.sort((a, b) => a - b);
    rounds.push({ p50: sorted[CLIENTS / 2]!, p99: sorted[Math.floor(CLIENTS * 0.99)]! });
    await new Promise((resolve) => setTimeout(resolve, 60));
  }
  for (const socket of sockets) socket.terminate();
  const middle = (pick: (one: { p50: number; p99: number }) => number) =>
    rounds.map(pick).sort((a, b) => a - b)[Math.floor(rounds.length / 2)]!;
  return { p50: middle(({ p50 }) => p50), p99: middle(({ p99 }) => p99) };
}

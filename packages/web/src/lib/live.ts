import type {
  ClientToServer,
  JoinAnswer,
  ServerToClient,
  SheetEvent,
  SheetPresence,
} from '@rivetside/shared';
import type { Socket } from 'socket.io-client';
import { access } from './access';

type LiveSocket = Socket<ServerToClient, ClientToServer>;
type Person = SheetPresence['people'][number];

export interface SheetListener {
  readonly afterSeq: () => number;
  readonly onEvent: (event: SheetEvent) => void;
  readonly onPresence: (people: Person[]) => void;
  readonly onState: (state: 'live' | 'cutOff') => void;
  /** More was missed than is sent again, or the sheet is no longer shown: read it anew. */
  readonly onGap?: () => void;
}
export interface JoinedSheet {
  leave(): void;
  writing(on: boolean): void;
}

const ANSWER_MS = 10_000;
const TRY_AGAIN_MS = 2_000;
/** Half of the time after which the server takes writing for stopped. */
const SAY_WRITING_AGAIN_MS = 3_000;

const sheets = new Map<string, Set<SheetListener>>();
const handlers = new Map<keyof ServerToClient, Set<(...said: never[]) => void>>();
const reconnected = new Set<() => void>();
let socket: LiveSocket | null = null;
let opening: Promise<LiveSocket> | null = null;
let wasConnected = false;

const listenersOf = (questionId: string): SheetListener[] => [...(sheets.get(questionId) ?? [])];

/** The talk is a quarter of the page's script and no first page needs it: it comes when it is first joined. */
async function open(): Promise<LiveSocket> {
  const { io } = await import('socket.io-client');
  const made: LiveSocket = io('/live', {
    transports: ['websocket', 'polling'],
    auth: (give) => give({ token: access.token() }),
    reconnectionDelay: 500,
    reconnectionDelayMax: 8_000,
  });
  socket = made;
  made.on('connect', () => handleConnect(made));
  made.on('disconnect', (why) => handleDisconnect(made, why));
  made.on('connect_error', (error) => void handleRefusal(made, error));
  made.on('sheet:event', (event) => listenersOf(event.questionId).forEach((one) => one.onEvent(event)));
  made.on('sheet:presence', ({ questionId, people }) =>
    listenersOf(questionId).forEach((one) => one.onPresence(people)),
  );
  made.onAny((name: string, ...said: unknown[]) => {
    for (const handler of [...(handlers.get(name as keyof ServerToClient) ?? [])])
      handler(...(said as never[]));
  });
  return made;
}

function connect(): void {
  if (access.token() === null) return;
  opening ??= open().catch((error: unknown) => {
    opening = null;
    throw error;
  });
  opening.catch(() => {
    for (const one of [...sheets.values()].flatMap((set) => [...set])) one.onState('cutOff');
    setTimeout(connect, TRY_AGAIN_MS);
  });
}

function handleConnect(connected: LiveSocket): void {
  for (const [questionId, listeners] of sheets) for (const one of listeners) join(connected, questionId, one);
  if (wasConnected) for (const tell of [...reconnected]) tell();
  wasConnected = true;
}

function handleDisconnect(lost: LiveSocket, why: string): void {
  for (const one of [...sheets.values()].flatMap((set) => [...set])) one.onState('cutOff');
  // Put out by the server: socket.io does not come back by itself then.
  if (why === 'io server disconnect') setTimeout(() => void renew(lost), TRY_AGAIN_MS);
}

async function handleRefusal(refused: LiveSocket, error: Error): Promise<void> {
  if (error.message === 'unauthorized') await renew(refused);
}

async function renew(refused: LiveSocket): Promise<void> {
  const used = access.token();
  if (used === null || refused !== socket) return;
  try {
    if ((await access.refresh(used)) === null) await access.lost();
  } catch {
    setTimeout(() => void renew(refused), TRY_AGAIN_MS);
    return;
  }
  if (refused === socket) refused.connect();
}

function join(connected: LiveSocket, questionId: string, listener: SheetListener): void {
  const isHere = () => sheets.get(questionId)?.has(listener) && connected.connected;
  const again = () => setTimeout(() => isHere() && join(connected, questionId, listener), TRY_AGAIN_MS);
  const asked = { questionId, afterSeq: listener.afterSeq() };
  connected.timeout(ANSWER_MS).emit('sheet:join', asked, (late: Error | null, answer: JoinAnswer) => {
    if (!isHere()) return;
    if (late) return void again();
    if (!answer.ok) return answer.status === 429 ? void again() : listener.onGap?.();
    if (!answer.whole) listener.onGap?.();
    else answer.events.forEach((event) => listener.onEvent(event));
    listener.onState('live');
  });
}

function leave(questionId: string, listener: SheetListener): void {
  const listeners = sheets.get(questionId);
  listeners?.delete(listener);
  if (listeners?.size !== 0) return;
  sheets.delete(questionId);
  if (socket?.connected) socket.emit('sheet:leave', { questionId });
}

function sayer(questionId: string): (on: boolean) => void {
  let saidAt = 0;
  return (on) => {
    const isNews = on ? Date.now() - saidAt >= SAY_WRITING_AGAIN_MS : saidAt > 0;
    if (!isNews || !socket?.connected) return;
    saidAt = on ? Date.now() : 0;
    socket.emit('sheet:writing', { questionId, writing: on });
  };
}

// Whoever signs out stops listening, and the next one listens in their own name.
access.onChange(() => {
  if (access.token() !== null) {
    if (sheets.size > 0 || handlers.size > 0) connect();
    return;
  }
  socket?.disconnect();
  socket = null;
  opening = null;
  wasConnected = false;
});

/** One connection a page for everything that happens while it is open. */
export const live = {
  joinSheet(questionId: string, listener: SheetListener): JoinedSheet {
    const listeners = sheets.get(questionId) ?? new Set();
    sheets.set(questionId, listeners.add(listener));
    if (socket?.connected) join(socket, questionId, listener);
    else connect();
    const writing = sayer(questionId);
    return {
      writing,
      leave: () => {
        writing(false);
        leave(questionId, listener);
      },
    };
  },

  on<N extends keyof ServerToClient>(name: N, handler: ServerToClient[N]): () => void {
    const those = handlers.get(name) ?? new Set();
    handlers.set(name, those.add(handler as (...said: never[]) => void));
    connect();
    return () => void those.delete(handler as (...said: never[]) => void);
  },

  /** Called after each break in the connection: whatever was read before it may be old. */
  onReconnect(tell: () => void): () => void {
    reconnected.add(tell);
    return () => void reconnected.delete(tell);
  },
};

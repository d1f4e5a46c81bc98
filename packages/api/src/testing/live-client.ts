import type { Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import type {
  ClientToServer,
  JoinAnswer,
  ServerToClient,
  SheetEvent,
  SheetPresence,
} from '@rivetside/shared';
import { io, type Socket } from 'socket.io-client';

const WAIT_MS = 5_000;

/** Somebody's page with its socket: keeps what it hears and waits for what it is told to wait for. */
export class LiveClient {
  readonly heard: SheetEvent[] = [];
  readonly presences: SheetPresence[] = [];
  readonly changes: string[] = [];
  readonly ended: string[] = [];
  readonly socket: Socket<ServerToClient, ClientToServer>;
  private readonly watchers = new Set<() => void>();

  constructor(server: Server, token: string) {
    const { port } = server.address() as AddressInfo;
    this.socket = io(`http://127.0.0.1:${port}/live`, {
      auth: { token },
      transports: ['websocket'],
      forceNew: true,
      reconnection: false,
    });
    this.socket.on('sheet:event', (event) => this.note(() => this.heard.push(event)));
    this.socket.on('sheet:presence', (presence) => this.note(() => this.presences.push(presence)));
    this.socket.on('question.changed', ({ questionId }) => this.note(() => this.changes.push(questionId)));
    this.socket.on('session:ended', ({ reason }) => this.note(() => this.ended.push(reason)));
    this.socket.on('connect', () => this.note(() => undefined));
    this.socket.on('disconnect', () => this.note(() => undefined));
  }

  connected(): Promise<void> {
    return this.until(() => this.socket.connected, 'a connection');
  }

  async join(questionId: string, afterSeq = 0): Promise<JoinAnswer> {
    await this.connected();
    return this.socket.timeout(WAIT_MS).emitWithAck('sheet:join', { questionId, afterSeq });
  }

  /** Names of who is at a sheet, as last told. */
  at(questionId: string): string[] {
    const last = this.presences.filter((one) => one.questionId === questionId).at(-1);
    return (last?.people ?? []).map(({ name, writing }) => (writing ? `${name} writes` : name)).sort();
  }

  /** Settles as soon as it holds; an event is what makes it look again, never a guess at how long something takes. */
  until(holds: () => boolean, what: string): Promise<void> {
    if (holds()) return Promise.resolve();
    return new Promise((resolve, reject) => {
      const look = () => {
        if (!holds()) return;
        this.watchers.delete(look);
        clearTimeout(late);
        resolve();
      };
      const late = setTimeout(() => {
        this.watchers.delete(look);
        reject(new Error(`${what} did not come`));
      }, WAIT_MS);
      this.watchers.add(look);
    });
  }

  close(): void {
    this.socket.disconnect();
  }

  private note(take: () => void): void {
    take();
    for (const look of [...this.watchers]) look();
  }
}

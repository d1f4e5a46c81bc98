import { Logger } from '@nestjs/common';
import { type OnGatewayConnection, type OnGatewayInit, WebSocketGateway } from '@nestjs/websockets';
import { activeChapterIds, type Actor } from '@rivetside/shared';
import { AccessTokens } from '../access/access-tokens.js';
import { ActorReader } from '../access/actor-reader.js';
import { PreparedReader } from '../database/prepared-reader.js';
import {
  chapterRoom,
  kitRoom,
  type LiveServer,
  type LiveSocket,
  Realtime,
  sessionRoom,
  userRoom,
} from './realtime.js';
import { SayLimit } from './say-limit.js';

const KITS_OF_CHAPTER = 'SELECT "kitId" FROM "kit_chapters" WHERE "chapterId" = ?';
const TOO_MUCH = { ok: false, status: 429, title: 'Too many messages', detail: 'Wait a moment.' } as const;

/** The door of the live talk: HTTP guards do not run here, so the token is asked for in the handshake. */
@WebSocketGateway({ namespace: '/live' })
export class LiveGateway implements OnGatewayInit, OnGatewayConnection {
  private readonly logger = new Logger(LiveGateway.name);

  constructor(
    private readonly tokens: AccessTokens,
    private readonly actors: ActorReader,
    private readonly reader: PreparedReader,
    private readonly realtime: Realtime,
  ) {}

  afterInit(server: LiveServer): void {
    server.use((socket, next) => {
      const actor = this.actorOf(socket.handshake.auth['token']);
      if (!actor) {
        this.logger.log({ refused: 'live' }, 'a socket without a live session was refused');
        next(new Error('unauthorized'));
        return;
      }
      socket.data.actor = actor;
      socket.data.sheets = new Set();
      socket.data.writing = {};
      boundWhatIsSaid(socket);
      next();
    });
    this.realtime.opened(server);
  }

  async handleConnection(socket: LiveSocket): Promise<void> {
    // Asked again now that whoever watches for changes of standing sees this socket: none slips in between.
    const actor = this.actors.ofSession(socket.data.actor.sessionId);
    if (!actor) {
      socket.disconnect(true);
      return;
    }
    socket.data.actor = actor;
    const chapters = activeChapterIds(actor);
    const kits = chapters.flatMap((id) => this.reader.all<{ kitId: string }>(KITS_OF_CHAPTER, [id]));
    await socket.join([
      sessionRoom(actor.sessionId),
      userRoom(actor.id),
      ...chapters.map(chapterRoom),
      ...kits.map(({ kitId }) => kitRoom(kitId)),
    ]);
  }

  private actorOf(token: unknown): Actor | null {
    const claims = typeof token === 'string' ? this.tokens.verify(token) : null;
    return claims && this.actors.ofClaims(claims);
  }
}

/** What is refused is answered where an answer was asked for, and goes nowhere. */
function boundWhatIsSaid(socket: LiveSocket): void {
  const limit = new SayLimit(performance.now());
  socket.use((said, next) => {
    const may = limit.next(performance.now());
    if (may === 'ok') return next();
    const answer: unknown = said.at(-1);
    if (typeof answer === 'function') (answer as (refusal: typeof TOO_MUCH) => void)(TOO_MUCH);
    if (may === 'out') socket.disconnect(true);
  });
}

import { Logger } from '@nestjs/common';
import { type OnGatewayConnection, type OnGatewayInit, WebSocketGateway } from '@nestjs/websockets';
import { activeChapterIds } from '@rivetside/shared';
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

const KITS_OF_CHAPTER = 'SELECT "kitId" FROM "kit_chapters" WHERE "chapterId" = ?';

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
      next();
    });
    this.realtime.opened(server);
  }

  async handleConnection(socket: LiveSocket): Promise<void> {
    const { actor } = socket.data;
    const chapters = activeChapterIds(actor);
    const kits = chapters.flatMap((id) => this.reader.all<{ kitId: string }>(KITS_OF_CHAPTER, [id]));
    await socket.join([
      sessionRoom(actor.sessionId),
      userRoom(actor.id),
      ...chapters.map(chapterRoom),
      ...kits.map(({ kitId }) => kitRoom(kitId)),
    ]);
  }

  private actorOf(token: unknown) {
    if (typeof token !== 'string') return null;
    try {
      const { sid, sub } = this.tokens.verify(token);
      const actor = this.actors.ofSession(sid);
      return actor?.id === sub ? actor : null;
    } catch {
      return null;
    }
  }
}

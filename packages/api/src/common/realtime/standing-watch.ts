import { Injectable, Logger, type OnApplicationBootstrap, type OnApplicationShutdown } from '@nestjs/common';
import { ActorReader } from '../access/actor-reader.js';
import { PreparedReader } from '../database/prepared-reader.js';
import { Realtime } from './realtime.js';

const LOOK_MS = 500;
const NEWEST = 'SELECT coalesce(max("seq"), 0) AS "seq" FROM "standing_changes"';
const SINCE = 'SELECT "seq", "userId" FROM "standing_changes" WHERE "seq" > ? ORDER BY "seq"';

interface StandingChange {
  seq: number;
  userId: string;
}

/**
 * A request reads who somebody is; an open socket was asked at its door only. The database numbers every change of
 * standing, whichever process or person made it, and each process looks after its own sockets here.
 */
@Injectable()
export class StandingWatch implements OnApplicationBootstrap, OnApplicationShutdown {
  private readonly logger = new Logger(StandingWatch.name);
  private timer: NodeJS.Timeout | null = null;
  private seen = 0;

  constructor(
    private readonly reader: PreparedReader,
    private readonly actors: ActorReader,
    private readonly realtime: Realtime,
  ) {}

  onApplicationBootstrap(): void {
    this.seen = this.reader.get<{ seq: number }>(NEWEST)?.seq ?? 0;
    this.timer = setInterval(() => this.lookSafely(), LOOK_MS);
    this.timer.unref();
  }

  onApplicationShutdown(): void {
    if (this.timer) clearInterval(this.timer);
  }

  look(): void {
    const changes = this.reader.all<StandingChange>(SINCE, [this.seen]);
    const [first] = changes;
    if (!first) return;
    // Where lines in between were cleared away, everybody is looked at.
    const users = first.seq > this.seen + 1 ? null : new Set(changes.map(({ userId }) => userId));
    this.seen = changes.at(-1)!.seq;
    for (const socket of this.realtime.socketsHere())
      if (!users || users.has(socket.data.actor.id))
        this.realtime.standingOf(socket, this.actors.ofSession(socket.data.actor.sessionId));
  }

  private lookSafely(): void {
    try {
      this.look();
    } catch (error) {
      this.logger.error({ err: error }, 'changes of standing could not be read');
    }
  }
}

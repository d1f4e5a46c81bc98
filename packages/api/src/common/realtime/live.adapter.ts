import type { INestApplicationContext } from '@nestjs/common';
import { IoAdapter } from '@nestjs/platform-socket.io';
import { createAdapter } from '@socket.io/redis-adapter';
import { createClient } from 'redis';
import type { Server, ServerOptions } from 'socket.io';
import type { Settings } from '../config/settings.js';
import { isOurPage } from './is-our-page.js';

/** Whatever a client may say is short. */
const MESSAGE_MAX_BYTES = 16 * 1024;
/** Whoever has not come through the door by then is put out. */
const DOOR_MS = 10_000;

/** socket.io with bounds, an Origin check, and Redis between processes where REDIS_URL is set. */
export class LiveAdapter extends IoAdapter {
  private between: ReturnType<typeof createAdapter> | null = null;
  private clients: { destroy(): void }[] = [];

  constructor(
    app: INestApplicationContext,
    private readonly settings: Settings,
  ) {
    super(app);
  }

  async connectRedis(): Promise<void> {
    const url = this.settings.env.REDIS_URL;
    if (!url) return;
    const out = createClient({ url });
    const incoming = out.duplicate();
    // Without a listener a lost connection would end the process; the clients connect again by themselves.
    for (const client of [out, incoming]) client.on('error', () => undefined);
    await Promise.all([out.connect(), incoming.connect()]);
    this.clients = [out, incoming];
    this.between = createAdapter(out, incoming);
  }

  override createIOServer(port: number, options?: ServerOptions): Server {
    const server = super.createIOServer(port, {
      ...options,
      maxHttpBufferSize: MESSAGE_MAX_BYTES,
      connectTimeout: DOOR_MS,
      perMessageDeflate: false,
      httpCompression: false,
      serveClient: false,
      cors: undefined,
      allowRequest: (
        request: { headers: { origin?: string; host?: string } },
        answer: (error: string | null, ok: boolean) => void,
      ) => answer(null, isOurPage(request.headers, this.settings)),
    } as ServerOptions) as Server;
    // The nameless namespace has no door of its own: nobody comes in there.
    server.of('/').use((_socket, next) => next(new Error('unauthorized')));
    if (this.between) server.adapter(this.between);
    return server;
  }

  override async dispose(): Promise<void> {
    await super.dispose();
    for (const client of this.clients) client.destroy();
  }
}

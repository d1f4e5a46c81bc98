import type { INestApplicationContext } from '@nestjs/common';
import { IoAdapter } from '@nestjs/platform-socket.io';
import { createAdapter } from '@socket.io/redis-adapter';
import { createClient } from 'redis';
import type { Server, ServerOptions } from 'socket.io';
import type { Settings } from '../config/settings.js';

const MESSAGE_MAX_BYTES = 16 * 1024;

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
    await Promise.all([out.connect(), incoming.connect()]);
    this.clients = [out, incoming];
    this.between = createAdapter(out, incoming);
  }

  override createIOServer(port: number, options?: ServerOptions): Server {
    const server = super.createIOServer(port, {
      ...options,
      maxHttpBufferSize: MESSAGE_MAX_BYTES,
      perMessageDeflate: false,
      serveClient: false,
      cors: undefined,
      allowRequest: (
        request: { headers: { origin?: string; host?: string } },
        answer: (error: string | null, ok: boolean) => void,
      ) => answer(null, this.isOurPage(request.headers.origin, request.headers.host)),
    } as ServerOptions) as Server;
    if (this.between) server.adapter(this.between);
    return server;
  }

  override async dispose(): Promise<void> {
    await super.dispose();
    for (const client of this.clients) client.destroy();
  }

  /** Browsers send Origin; what sends none is no browser, and the token still decides. */
  private isOurPage(origin: string | undefined, host: string | undefined): boolean {
    if (origin === undefined || origin === this.settings.publicUrl) return true;
    return !this.settings.production && origin.replace(/^https?:\/\//, '') === host;
  }
}

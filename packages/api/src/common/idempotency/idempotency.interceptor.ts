import { createHash } from 'node:crypto';
import { type CallHandler, type ExecutionContext, Injectable, type NestInterceptor } from '@nestjs/common';
import { HTTP_CODE_METADATA } from '@nestjs/common/constants.js';
import type { FastifyReply, FastifyRequest } from 'fastify';
import { from, lastValueFrom, type Observable } from 'rxjs';
import { PreparedReader } from '../database/prepared-reader.js';
import { BadInput, Conflict } from '../errors/app-error.js';
import { Clock } from '../time/clock.js';
import { type NamedWrite, namedWrite } from './kept-answers.js';

const FIND = `SELECT "method", "path", "bodyHash", "status", "response" FROM "idempotency_keys" WHERE "userId" = ? AND "key" = ?`;
const KEY_MAX = 200;

type Kept = Pick<NamedWrite, 'method' | 'path' | 'bodyHash' | 'status'> & { response: string };

/** The same key and body gives the first answer again, also while the first is still under way. */
@Injectable()
export class IdempotencyInterceptor implements NestInterceptor {
  private readonly underWay = new Map<string, Promise<unknown>>();

  constructor(
    private readonly reader: PreparedReader,
    private readonly clock: Clock,
  ) {}

  intercept(context: ExecutionContext, next: CallHandler): Observable<unknown> {
    if (context.getType() !== 'http') return next.handle();
    const request = context.switchToHttp().getRequest<FastifyRequest & { user?: { id: string } }>();
    const key = request.headers['idempotency-key'];
    if (key === undefined || request.method === 'GET' || !request.user || request.isMultipart?.())
      return next.handle();
    return from(this.once(this.named(context, request, String(key)), context, next));
  }

  private named(
    context: ExecutionContext,
    request: FastifyRequest & { user?: { id: string } },
    key: string,
  ): NamedWrite {
    if (key.length === 0 || key.length > KEY_MAX)
      throw new BadInput([
        { path: 'Idempotency-Key', message: `The Idempotency-Key has 1 to ${KEY_MAX} characters.` },
      ]);
    const status = (Reflect.getMetadata(HTTP_CODE_METADATA, context.getHandler()) as number | undefined) ?? 0;
    return {
      userId: request.user!.id,
      key,
      method: request.method,
      path: request.url,
      bodyHash: createHash('sha256')
        .update(JSON.stringify(request.body ?? null))
        .digest('base64url'),
      status: status || (request.method === 'POST' ? 201 : 200),
      at: this.clock.instant(),
    };
  }

  private async once(write: NamedWrite, context: ExecutionContext, next: CallHandler): Promise<unknown> {
    const name = `${write.userId}\n${write.key}`;
    // Whoever comes second waits for the first, whatever its end, and then looks for its answer.
    while (this.underWay.has(name)) await this.underWay.get(name)!.catch(() => undefined);
    const kept = this.reader.get<Kept>(FIND, [write.userId, write.key]);
    if (kept) return this.answerAgain(kept, write, context);
    const first = namedWrite.run(write, () => lastValueFrom(next.handle(), { defaultValue: undefined }));
    this.underWay.set(name, first);
    try {
      return await first;
    } finally {
      this.underWay.delete(name);
    }
  }

  private answerAgain(kept: Kept, write: NamedWrite, context: ExecutionContext): unknown {
    if (kept.bodyHash !== write.bodyHash || kept.method !== write.method || kept.path !== write.path)
      throw new Conflict('This Idempotency-Key was used for another request.');
    const reply = context.switchToHttp().getResponse<FastifyReply>();
    void reply.code(kept.status).header('idempotency-replayed', 'true');
    return kept.status === 204 ? undefined : (JSON.parse(kept.response) as unknown);
  }
}

import { createHash } from 'node:crypto';
import { type CallHandler, type ExecutionContext, Injectable, type NestInterceptor } from '@nestjs/common';
import { HTTP_CODE_METADATA } from '@nestjs/common/constants.js';
import type { FastifyReply, FastifyRequest } from 'fastify';
import { from, lastValueFrom, type Observable } from 'rxjs';
import { PreparedReader } from '../database/prepared-reader.js';
import { UnitOfWork } from '../database/unit-of-work.js';
import { BadInput, Conflict } from '../errors/app-error.js';
import { problemOf } from '../errors/problem.js';
import { Clock } from '../time/clock.js';
import { asNamedWrite, correctAnswer, type NamedWrite } from './kept-answers.js';

/** Nobody sends again after a day. */
export const ANSWERS_KEPT_MS = 24 * 3_600_000;
const FIND = `SELECT "method", "path", "bodyHash", "status", "response" FROM "idempotency_keys"
  WHERE "userId" = ? AND "key" = ? AND "createdAt" > ?`;
const KEY_FORM = /^[\x21-\x7e]{1,200}$/;
const READS = new Set(['GET', 'HEAD', 'OPTIONS']);

type Kept = Pick<NamedWrite, 'method' | 'path' | 'bodyHash' | 'status'> & { response: string };
type WriteRequest = FastifyRequest & { user?: { readonly id: string } };

/** The same key and body gives the first answer again, also while the first is still under way. */
@Injectable()
export class IdempotencyInterceptor implements NestInterceptor {
  private readonly underWay = new Map<string, Promise<unknown>>();

  constructor(
    private readonly reader: PreparedReader,
    private readonly unitOfWork: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  intercept(context: ExecutionContext, next: CallHandler): Observable<unknown> {
    if (context.getType() !== 'http') return next.handle();
    const request = context.switchToHttp().getRequest<WriteRequest>();
    const key = request.headers['idempotency-key'];
    if (key === undefined || READS.has(request.method) || !request.user) return next.handle();
    const write = this.nameOf(context, request, { key: String(key), userId: request.user.id });
    return from(this.once(write, context, next));
  }

  private nameOf(
    context: ExecutionContext,
    request: WriteRequest,
    { key, userId }: Pick<NamedWrite, 'key' | 'userId'>,
  ): NamedWrite {
    if (!KEY_FORM.test(key))
      throw new BadInput([
        { path: 'Idempotency-Key', message: 'An Idempotency-Key has 1 to 200 letters, digits or signs.' },
      ]);
    const status = Reflect.getMetadata(HTTP_CODE_METADATA, context.getHandler()) as number | undefined;
    return {
      userId,
      key,
      method: request.method,
      path: request.url,
      bodyHash: hashOf(request),
      status: status ?? (request.method === 'POST' ? 201 : 200),
      at: this.clock.instant(),
    };
  }

  private async once(write: NamedWrite, context: ExecutionContext, next: CallHandler): Promise<unknown> {
    const name = `${write.userId}\n${write.key}`;
    // Whoever comes second waits for the first, whatever its end, and then looks for its answer.
    while (this.underWay.has(name)) await this.underWay.get(name)!.catch(() => undefined);
    const since = new Date(this.clock.now().getTime() - ANSWERS_KEPT_MS).toISOString();
    const kept = this.reader.get<Kept>(FIND, [write.userId, write.key, since]);
    if (kept) return answerAgain(kept, write, context);
    const first = this.first(write, next);
    this.underWay.set(name, first);
    try {
      return await first;
    } finally {
      this.underWay.delete(name);
    }
  }

  /** The unit kept what it returned; what is replied may differ from it, and then that is kept. */
  private async first(write: NamedWrite, next: CallHandler): Promise<unknown> {
    try {
      const answer: unknown = await asNamedWrite(write, () =>
        lastValueFrom(next.handle(), { defaultValue: undefined }),
      );
      await this.correct(write, { status: write.status, response: JSON.stringify(answer ?? null) });
      return answer;
    } catch (error) {
      const problem = problemOf(error, write.path.split('?')[0] ?? '/');
      if (problem.status < 500)
        await this.correct(write, { status: problem.status, response: JSON.stringify(problem) });
      throw error;
    }
  }

  private async correct(write: NamedWrite, answer: { status: number; response: string }): Promise<void> {
    if (write.kept === undefined || (write.kept === answer.response && write.status === answer.status))
      return;
    await this.unitOfWork.runPrepared((db) => correctAnswer(db, write, answer));
  }
}

/** An upload is not read yet here: its length stands for it. */
function hashOf(request: WriteRequest): string {
  if (request.isMultipart?.()) return `multipart ${request.headers['content-length'] ?? 'of unknown length'}`;
  return createHash('sha256')
    .update(JSON.stringify(request.body ?? null))
    .digest('base64url');
}

function answerAgain(kept: Kept, write: NamedWrite, context: ExecutionContext): unknown {
  if (kept.bodyHash !== write.bodyHash || kept.method !== write.method || kept.path !== write.path)
    throw new Conflict('This Idempotency-Key was used for another request.');
  const reply = context.switchToHttp().getResponse<FastifyReply>();
  void reply.code(kept.status).header('idempotency-replayed', 'true');
  if (kept.status >= 400) void reply.header('content-type', 'application/problem+json; charset=utf-8');
  return kept.status === 204 ? undefined : (JSON.parse(kept.response) as unknown);
}

import { type ArgumentsHost, Catch, type ExceptionFilter, HttpException, Logger } from '@nestjs/common';
import type { FastifyReply, FastifyRequest } from 'fastify';
import { TooMany } from './app-error.js';
import { problemOf } from './problem.js';

/** The one place that knows HTTP statuses. */
@Catch()
export class AppErrorFilter implements ExceptionFilter {
  private readonly logger = new Logger('Refusals');

  catch(error: unknown, host: ArgumentsHost): void {
    const http = host.switchToHttp();
    sendProblem(error, http.getRequest<FastifyRequest>(), http.getResponse<FastifyReply>());
    this.log(error, http.getRequest<FastifyRequest>());
  }

  private log(error: unknown, request: FastifyRequest): void {
    const { status } = problemOf(error, '');
    const facts = { requestId: request.id, method: request.method, status };
    if (status >= 500) this.logger.error({ ...facts, err: error }, 'failed');
    else this.logger.log({ ...facts, reason: error instanceof Error ? error.message : 'refused' }, 'refused');
  }
}

/** Also used by Fastify's own handlers, for what never reaches Nest. */
export function sendProblem(error: unknown, request: FastifyRequest, reply: FastifyReply): void {
  if (reply.sent) return;
  const problem = problemOf(error, request.url.split('?')[0] ?? '/');
  const retryAfter = retryAfterOf(error);
  if (retryAfter !== null) void reply.header('retry-after', String(retryAfter));
  void reply
    .code(problem.status)
    .header('content-type', 'application/problem+json; charset=utf-8')
    .header('cache-control', 'no-store')
    .send(JSON.stringify(problem));
}

function retryAfterOf(error: unknown): number | null {
  if (error instanceof TooMany) return error.retryAfterSeconds;
  if (error instanceof HttpException && error.getStatus() === 429) return 60;
  return null;
}

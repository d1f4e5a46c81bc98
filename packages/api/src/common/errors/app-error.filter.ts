import { type ArgumentsHost, Catch, type ExceptionFilter, HttpException, Logger } from '@nestjs/common';
import type { FastifyReply, FastifyRequest } from 'fastify';
import { AppError, TooMany, WrongMethod } from './app-error.js';
import { problemOf, statusOf } from './problem.js';

const logger = new Logger('Refusals');
const TOO_MANY_SECONDS = 60;

type KnownRequest = FastifyRequest & {
  user?: { readonly id: string };
  server: { allowedAt?: (url: string) => string[] };
};

/** The one place that knows HTTP statuses. */
@Catch()
export class AppErrorFilter implements ExceptionFilter {
  catch(error: unknown, host: ArgumentsHost): void {
    // A socket's handler answers by its own acknowledgement.
    if (host.getType() !== 'http') {
      logger.error({ err: error }, 'a socket handler failed');
      return;
    }
    const http = host.switchToHttp();
    const request = http.getRequest<KnownRequest>();
    refuse(request.is404 ? addressFault(error, request) : error, request, http.getResponse<FastifyReply>());
  }
}

/** Also used for what never reaches Nest, such as an address that cannot be read. */
export function refuse(error: unknown, request: KnownRequest, reply: FastifyReply): void {
  log(error, request);
  if (reply.sent) return;
  const problem = problemOf(error, request.url.split('?')[0] ?? '/');
  if (error instanceof WrongMethod) void reply.header('allow', error.allowed.join(', '));
  if (problem.status === 429) void reply.header('retry-after', String(secondsOf(error)));
  void reply
    .code(problem.status)
    .header('content-type', 'application/problem+json; charset=utf-8')
    .header('cache-control', 'no-store')
    .send(JSON.stringify(problem));
}

/** Nothing matched: because of the method, or because of the address? */
function addressFault(error: unknown, request: KnownRequest): unknown {
  const allowed = request.server.allowedAt?.(request.url) ?? [];
  return allowed.length === 0 || allowed.includes(request.method) ? error : new WrongMethod(allowed);
}

function secondsOf(error: unknown): number {
  return error instanceof TooMany ? error.retryAfterSeconds : TOO_MANY_SECONDS;
}

/** Without the query: it may carry a token. */
function log(error: unknown, request: KnownRequest): void {
  const status = statusOf(error);
  const facts = {
    requestId: request.id,
    method: request.method,
    path: request.url.split('?')[0],
    status,
    ...(request.user ? { userId: request.user.id } : {}),
  };
  if (status >= 500 && !(error instanceof HttpException)) logger.error({ ...facts, err: error }, 'failed');
  else logger.log({ ...facts, reason: reasonOf(error) }, 'refused');
}

/** Our own words only: a parser's message quotes what was sent, and that may be a password. */
function reasonOf(error: unknown): string {
  if (error instanceof AppError) return error.message;
  if (typeof error !== 'object' || error === null) return 'refused';
  const { code, name } = error as { code?: unknown; name?: unknown };
  return String(code ?? name ?? 'refused');
}

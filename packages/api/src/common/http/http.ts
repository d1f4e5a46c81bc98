import cookie from '@fastify/cookie';
import multipart from '@fastify/multipart';
import type { NestFastifyApplication } from '@nestjs/platform-fastify';
import { FastifyAdapter } from '@nestjs/platform-fastify';
import { PHOTO_MAX_BYTES } from '@rivetside/shared';
import type { FastifyReply, FastifyRequest } from 'fastify';
import type { Settings } from '../config/settings.js';
import { BadInput, WrongType } from '../errors/app-error.js';
import { refuse } from '../errors/app-error.filter.js';
import { isTooDeep } from './body-depth.js';
import { answerClientError } from './client-errors.js';
import { KnownRoutes } from './known-routes.js';
import { requestIdOf } from './request-id.js';
import { securityHeaders } from './security-headers.js';

const JSON_MAX_BYTES = 512 * 1024;
const REQUEST_MS = 60_000;
const PARAM_MAX = 200;

export function makeAdapter(settings: Settings): FastifyAdapter {
  return new FastifyAdapter({
    bodyLimit: JSON_MAX_BYTES,
    trustProxy: settings.env.TRUST_PROXY === '1',
    genReqId: requestIdOf,
    requestTimeout: REQUEST_MS,
    routerOptions: { maxParamLength: PARAM_MAX, ignoreTrailingSlash: true },
    onProtoPoisoning: 'error',
    onConstructorPoisoning: 'error',
    // What was taken in before a stop is answered; the socket closes after it.
    return503OnClosing: false,
    clientErrorHandler: answerClientError,
    frameworkErrors: (error: unknown, request: unknown, reply: unknown) => {
      void (reply as FastifyReply).headers(securityHeaders(settings.https));
      refuse(error, request as FastifyRequest, reply as FastifyReply);
    },
  });
}

/** Headers, parsers and bounds, before any route. */
export async function prepareHttp(app: NestFastifyApplication, settings: Settings): Promise<void> {
  const fastify = app.getHttpAdapter().getInstance();
  const known = KnownRoutes.listenTo(fastify);
  fastify.decorate('allowedAt', (url: string) => known.allowed(url));
  fastify.removeContentTypeParser('text/plain');
  await app.register(cookie as never);
  await app.register(multipart as never, {
    limits: { fileSize: PHOTO_MAX_BYTES, files: 1, fields: 8, fieldSize: 2_000, parts: 9, headerPairs: 50 },
    throwFileSizeLimit: true,
  });

  const headers = securityHeaders(settings.https);
  const privateHeaders = { ...headers, 'cache-control': 'no-store' };
  // With callbacks: a promise at every hook of every request is measurable.
  fastify.addHook('onRequest', (request: FastifyRequest, reply: FastifyReply, done: () => void) => {
    void reply.headers(request.url.startsWith('/api') ? privateHeaders : headers);
    void reply.header('x-request-id', request.id);
    done();
  });
  fastify.addHook('preValidation', (request: FastifyRequest, _reply, done: (error?: Error) => void) => {
    done(faultOfBody(request));
  });
}

function faultOfBody(request: FastifyRequest): Error | undefined {
  if (request.body === undefined || request.body === null) return undefined;
  const kind = request.headers['content-type'] ?? '';
  // A form of any other site may be sent here without asking: only routes that expect one take it.
  if (kind.startsWith('application/x-www-form-urlencoded') && !takesForms(request))
    return new WrongType('Send JSON, as application/json.');
  if (isTooDeep(request.body))
    return new BadInput([{ path: '', message: 'This is nested deeper than anything that is asked for.' }]);
  return undefined;
}

/** A route says so with `@RouteConfig({ takesForms: true })`. */
function takesForms(request: FastifyRequest): boolean {
  return (request.routeOptions.config as { takesForms?: boolean }).takesForms === true;
}

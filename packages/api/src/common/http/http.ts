import cookie from '@fastify/cookie';
import helmet from '@fastify/helmet';
import multipart from '@fastify/multipart';
import type { NestFastifyApplication } from '@nestjs/platform-fastify';
import { FastifyAdapter } from '@nestjs/platform-fastify';
import { PHOTO_MAX_BYTES } from '@rivetside/shared';
import type { FastifyReply, FastifyRequest } from 'fastify';
import type { Settings } from '../config/settings.js';
import { BadInput } from '../errors/app-error.js';
import { sendProblem } from '../errors/app-error.filter.js';
import { newId } from '../ids.js';
import { isTooDeep } from './body-depth.js';

const JSON_MAX_BYTES = 512 * 1024;
const REQUEST_MS = 60_000;
const HSTS_SECONDS = 31_536_000;

export function makeAdapter(settings: Settings): FastifyAdapter {
  return new FastifyAdapter({
    bodyLimit: JSON_MAX_BYTES,
    trustProxy: settings.env.TRUST_PROXY === '1',
    genReqId: () => newId(),
    requestTimeout: REQUEST_MS,
    routerOptions: { maxParamLength: 200, ignoreTrailingSlash: true },
    onProtoPoisoning: 'error',
    onConstructorPoisoning: 'error',
    frameworkErrors: (error: unknown, request: unknown, reply: unknown) =>
      sendProblem(error, request as FastifyRequest, reply as FastifyReply),
  });
}

/** Headers, parsers and bounds, before any route. */
export async function prepareHttp(app: NestFastifyApplication, settings: Settings): Promise<void> {
  const fastify = app.getHttpAdapter().getInstance();
  await app.register(helmet as never, {
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'none'"],
        frameAncestors: ["'none'"],
        baseUri: ["'none'"],
        formAction: ["'none'"],
      },
    },
    strictTransportSecurity: settings.https ? { maxAge: HSTS_SECONDS, includeSubDomains: false } : false,
    referrerPolicy: { policy: 'same-origin' },
    crossOriginOpenerPolicy: { policy: 'same-origin' },
    crossOriginResourcePolicy: { policy: 'same-origin' },
    xPoweredBy: true,
  });
  await app.register(cookie as never);
  await app.register(multipart as never, {
    limits: { fileSize: PHOTO_MAX_BYTES, files: 1, fields: 8, fieldSize: 2_000, parts: 9, headerPairs: 50 },
    throwFileSizeLimit: true,
  });
  fastify.addHook('onRequest', async (request: FastifyRequest, reply: FastifyReply) => {
    void reply.header('x-request-id', request.id);
    if (request.url.startsWith('/api')) void reply.header('cache-control', 'no-store');
  });
  fastify.addHook('preValidation', async (request: FastifyRequest) => {
    if (request.body !== undefined && isTooDeep(request.body))
      throw new BadInput([{ path: '', message: 'This is nested deeper than anything that is asked for.' }]);
  });
}

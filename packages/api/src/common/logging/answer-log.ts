import { Logger } from '@nestjs/common';
import type { FastifyInstance, FastifyReply, FastifyRequest } from 'fastify';
import type { Settings } from '../config/settings.js';

/** A line for each answer, on request only: it costs more than a small answer does. Refusals are told anyway. */
export function logAnswers(fastify: FastifyInstance, settings: Settings): void {
  if (settings.env.LOG_LEVEL !== 'debug' && settings.env.LOG_LEVEL !== 'trace') return;
  const logger = new Logger('Answers');
  fastify.addHook('onResponse', (request: FastifyRequest, reply: FastifyReply, done: () => void) => {
    const { id: requestId, method, url } = request;
    const facts = { requestId, method, path: url.split('?')[0], status: reply.statusCode };
    logger.debug({ ...facts, ms: Math.round(reply.elapsedTime) }, 'answered');
    done();
  });
}

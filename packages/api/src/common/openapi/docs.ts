import type { NestFastifyApplication } from '@nestjs/platform-fastify';
import { DocumentBuilder, type OpenAPIObject, SwaggerModule } from '@nestjs/swagger';
import type { FastifyReply, FastifyRequest } from 'fastify';
import { completed } from './complete-document.js';

/** Swagger's page sets styles of its own; only that page may. */
const DOCS_POLICY =
  "default-src 'self'; style-src 'self' 'unsafe-inline'; img-src 'self' data:; form-action 'none'; frame-ancestors 'none'; base-uri 'none'";
const ABOUT = `Advice among builders. Lengths are in inches, angles in degrees, forces in pounds-force, times in UTC, money in minor units.

Lists are paged by cursor: \`?limit=&cursor=\` gives \`{ items, nextCursor }\`. Every refusal is \`application/problem+json\` (RFC 9457).
A write may carry an \`Idempotency-Key\`: sent again with the same body it gives the first answer again.`;

/** The document at /api/docs-json, a page for people at /api/docs. */
export function serveDocs(app: NestFastifyApplication): void {
  let document: OpenAPIObject | null = null;
  // Made when first asked for: nobody else should wait for it at start.
  SwaggerModule.setup('api/docs', app, () => (document ??= documentOf(app)), {
    jsonDocumentUrl: 'api/docs-json',
    yamlDocumentUrl: 'api/docs-yaml',
    customSiteTitle: 'Rivetside API',
    swaggerOptions: { validatorUrl: null, docExpansion: 'none' },
  });
  app
    .getHttpAdapter()
    .getInstance()
    .addHook('onRequest', (request: FastifyRequest, reply: FastifyReply, done: () => void) => {
      if (request.url.startsWith('/api/docs')) void reply.header('content-security-policy', DOCS_POLICY);
      done();
    });
}

export function documentOf(app: NestFastifyApplication): OpenAPIObject {
  const config = new DocumentBuilder()
    .setTitle('Rivetside')
    .setDescription(ABOUT)
    .setVersion('1')
    .setOpenAPIVersion('3.1.0')
    .addBearerAuth()
    .build();
  return completed(SwaggerModule.createDocument(app, config));
}

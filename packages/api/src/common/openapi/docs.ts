import type { NestFastifyApplication } from '@nestjs/platform-fastify';
import { DocumentBuilder, type OpenAPIObject, SwaggerModule } from '@nestjs/swagger';
import type { FastifyReply, FastifyRequest } from 'fastify';

const METHODS = ['get', 'post', 'put', 'patch', 'delete'] as const;
const ERRORS: Readonly<Record<string, string>> = {
  400: 'Something in it cannot be; `errors` names each field.',
  401: 'Not signed in.',
  403: 'Not allowed.',
  404: 'No such thing, or not yours to see.',
  409: 'It does not fit how things stand.',
  413: 'Too large.',
  415: 'Of a kind that is not taken.',
  429: 'Too many tries; `Retry-After` says when.',
};
const PROBLEM = {
  type: 'object',
  required: ['type', 'title', 'status', 'detail', 'instance'],
  properties: {
    type: { type: 'string' },
    title: { type: 'string' },
    status: { type: 'integer' },
    detail: { type: 'string' },
    instance: { type: 'string' },
    errors: {
      type: 'array',
      items: {
        type: 'object',
        required: ['path', 'message'],
        properties: { path: { type: 'string' }, message: { type: 'string' } },
      },
    },
  },
};
/** Swagger's page sets styles of its own; only that page may. */
const DOCS_POLICY =
  "default-src 'self'; style-src 'self' 'unsafe-inline'; img-src 'self' data:; frame-ancestors 'none'; base-uri 'none'";

/** Every operation may answer with a problem: said once here instead of at every route. */
function withErrors(document: OpenAPIObject): OpenAPIObject {
  document.components ??= {};
  document.components.schemas ??= {};
  document.components.schemas['Problem'] = PROBLEM as never;
  for (const path of Object.values(document.paths))
    for (const method of METHODS) {
      const responses = path[method]?.responses;
      if (!responses) continue;
      for (const [status, description] of Object.entries(ERRORS))
        responses[status] ??= {
          description,
          content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
        };
    }
  return document;
}

/** The document at /api/docs-json, a page for people at /api/docs. */
export function serveDocs(app: NestFastifyApplication): void {
  const config = new DocumentBuilder()
    .setTitle('Rivetside')
    .setDescription(
      'Advice among builders. Lengths in inches, angles in degrees, forces in pounds-force, times in UTC.',
    )
    .setVersion('1')
    .setOpenAPIVersion('3.1.0')
    .addBearerAuth()
    .build();
  let document: OpenAPIObject | null = null;
  SwaggerModule.setup(
    'api/docs',
    app,
    () => (document ??= withErrors(SwaggerModule.createDocument(app, config))),
    {
      jsonDocumentUrl: 'api/docs-json',
      yamlDocumentUrl: 'api/docs-yaml',
    },
  );
  app
    .getHttpAdapter()
    .getInstance()
    .addHook('onRequest', async (request: FastifyRequest, reply: FastifyReply) => {
      if (request.url.startsWith('/api/docs')) void reply.header('content-security-policy', DOCS_POLICY);
    });
}

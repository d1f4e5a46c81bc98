import { STATUS_CODES } from 'node:http';
import type { OpenAPIObject } from '@nestjs/swagger';

const METHODS = ['get', 'post', 'put', 'patch', 'delete'] as const;
type Method = (typeof METHODS)[number];
type Operation = NonNullable<OpenAPIObject['paths'][string]['get']> & { 'x-roles'?: string[] };

const ERRORS: Readonly<Record<string, string>> = {
  400: 'Something in it cannot be; `errors` names each field.',
  401: 'Not signed in.',
  403: 'Not allowed.',
  404: 'No such thing, or not yours to see.',
  429: 'Too many tries; `Retry-After` says when.',
  503: 'Not ready, or a process that only reads.',
};
const ERRORS_OF_WRITES: Readonly<Record<string, string>> = {
  409: 'It does not fit how things stand; `current` says how they stand where that helps.',
  413: 'Too large.',
  415: 'Of a kind that is not taken.',
  507: 'The disk is full: nothing was changed.',
};

const PROBLEM = {
  type: 'object',
  required: ['type', 'title', 'status', 'detail', 'instance'],
  properties: {
    type: { type: 'string', description: 'A URI reference; `about:blank` when the title says it all.' },
    title: { type: 'string' },
    status: { type: 'integer' },
    detail: { type: 'string', description: 'What happened and what to do, for a person.' },
    instance: { type: 'string', description: 'The path that was asked for.' },
    errors: {
      type: 'array',
      items: {
        type: 'object',
        required: ['path', 'message'],
        properties: {
          path: { type: 'string', description: 'Dotted, such as `layers.0.thickness`.' },
          message: { type: 'string' },
        },
      },
    },
    current: { type: 'object', description: 'How things stand, on a conflict.' },
  },
};
const PROBLEM_CONTENT = {
  'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } },
};
const IDEMPOTENCY_KEY = {
  name: 'Idempotency-Key',
  in: 'header',
  required: false,
  description:
    'Sent again with the same body it gives the first answer again; with another body it is a conflict.',
  schema: { type: 'string', minLength: 1, maxLength: 200 },
} as const;

/** What every operation has in common is said once here instead of at every route. */
export function completed(document: OpenAPIObject): OpenAPIObject {
  const components = (document.components ??= {});
  (components.schemas ??= {})['Problem'] = PROBLEM as never;
  for (const path of Object.values(document.paths))
    for (const method of METHODS) if (path[method]) complete(path[method], method);
  return document;
}

function complete(operation: Operation, method: Method): void {
  const writes = method !== 'get';
  const roles = operation['x-roles'] ?? [];
  const open = roles.includes('guest');
  completeResponses(operation.responses, writes ? { ...ERRORS, ...ERRORS_OF_WRITES } : ERRORS);
  if (writes && !open) (operation.parameters ??= []).push(IDEMPOTENCY_KEY);
  operation.summary ??= inWords(operation.operationId ?? '');
  operation.description ??= open ? 'For everybody.' : `For: ${roles.map(inWords).join(', ')}.`;
}

function completeResponses(
  responses: Operation['responses'],
  errors: Readonly<Record<string, string>>,
): void {
  for (const [status, response] of Object.entries(responses))
    if (response && 'description' in response) response.description ||= STATUS_CODES[status] ?? status;
  for (const [status, description] of Object.entries(errors))
    responses[status] ??= { description, content: PROBLEM_CONTENT };
}

/** `AuthController_forgotPassword` → `forgot password` */
function inWords(name: string): string {
  return name
    .replace(/^.*_/, '')
    .replace(/[A-Z]/g, (capital) => ` ${capital.toLowerCase()}`)
    .trim();
}

import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import staticFiles from '@fastify/static';
import type { FastifyInstance, FastifyReply, FastifyRequest } from 'fastify';
import type { Settings } from '../config/settings.js';

const NONCE = /__CSP_NONCE__/g;
const NOT_PAGES = /^\/(api|live|dev|assets|socket\.io)(\/|$)/;
const HASHED = /[/\\]assets[/\\]/;
const A_YEAR = 'public, max-age=31536000, immutable';

const BASE_POLICY = [
  "img-src 'self' blob: data:",
  "font-src 'self'",
  "connect-src 'self'",
  "worker-src 'self'",
  "manifest-src 'self'",
  "object-src 'none'",
  "base-uri 'none'",
  "form-action 'self'",
  "frame-ancestors 'none'",
];
/** A worker's own file decides what the worker may do: files may reach what is ours and run nothing inline. */
const FILE_POLICY = ["default-src 'self'", ...BASE_POLICY].join('; ');

/** One nonce a page view; nothing inline runs without it. Mantine takes it for its own style elements. */
function pagePolicy(nonce: string, https: boolean): string {
  return [
    "default-src 'self'",
    `script-src 'self' 'nonce-${nonce}'`,
    `style-src 'self' 'nonce-${nonce}'`,
    ...BASE_POLICY,
    ...(https ? ['upgrade-insecure-requests'] : []),
  ].join('; ');
}

/** A person's navigation, and nothing that asks for data or a file. */
export function wantsPage({
  method,
  url,
  headers,
}: Pick<FastifyRequest, 'method' | 'url' | 'headers'>): boolean {
  if (method !== 'GET' && method !== 'HEAD') return false;
  const path = url.split('?')[0] ?? '/';
  // The file itself would go out with its nonce unfilled.
  if (path === '/index.html') return true;
  const accept = headers.accept ?? '*/*';
  return !NOT_PAGES.test(path) && !/\.[a-z0-9]+$/i.test(path) && /text\/html|\*\/\*/.test(accept);
}

/** Serves the built page: files as they are, every other address the page itself. */
export async function serveWebPage(
  fastify: FastifyInstance,
  settings: Settings,
  webRoot: string,
): Promise<void> {
  const indexFile = join(webRoot, 'index.html');
  if (!existsSync(indexFile)) return;
  const index = readFileSync(indexFile, 'utf8');

  fastify.addHook('onRequest', (request: FastifyRequest, reply: FastifyReply, done: () => void) => {
    if (!wantsPage(request)) {
      done();
      return;
    }
    const nonce = randomBytes(16).toString('base64');
    void reply
      .header('content-security-policy', pagePolicy(nonce, settings.https))
      .header('cache-control', 'no-cache')
      .type('text/html; charset=utf-8')
      .send(index.replace(NONCE, nonce));
  });

  await fastify.register(staticFiles, {
    root: webRoot,
    index: false,
    preCompressed: true,
    cacheControl: false,
    // Known at start: an address that is no file never reaches the disk, and nobody probes it.
    wildcard: false,
    globIgnore: settings.production ? ['**/*.map', '**/*.br', '**/*.gz'] : ['**/*.br', '**/*.gz'],
    setHeaders: (reply, path) => {
      reply.header('cache-control', HASHED.test(path) ? A_YEAR : 'no-cache');
      reply.header('content-security-policy', FILE_POLICY);
    },
  });
}

import type { FastifyInstance } from 'fastify';
import { KnownRoutes } from './known-routes.js';

type Listener = (route: { url: string; method: string | string[] }) => void;

function knowing(...routes: [string, string | string[]][]): KnownRoutes {
  let hear: Listener = () => undefined;
  const known = KnownRoutes.listenTo({
    addHook: (_name: string, listener: Listener) => (hear = listener),
  } as unknown as FastifyInstance);
  for (const [url, method] of routes) hear({ url, method });
  return known;
}

describe('KnownRoutes', () => {
  const known = knowing(
    ['/api/kits', 'GET'],
    ['/api/kits', ['POST']],
    ['/api/kits/:kitId', 'GET'],
    ['/api/kits/export.csv', 'GET'],
    ['/files/*', 'GET'],
  );

  it.each([
    { url: '/api/kits', allowed: ['GET', 'POST'] },
    { url: '/api/kits/?limit=1', allowed: ['GET', 'POST'] },
    { url: '/api/kits/17', allowed: ['GET'] },
    { url: '/api/kits/17/sections', allowed: [] },
    { url: '/api/kits/exportXcsv', allowed: ['GET'] },
    { url: '/api', allowed: [] },
    { url: '/', allowed: [] },
    { url: '/files/a', allowed: [] },
  ])('allows $allowed at $url', ({ url, allowed }) => expect(known.allowed(url)).toEqual(allowed));
});

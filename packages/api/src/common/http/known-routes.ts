import type { FastifyInstance, RouteOptions } from 'fastify';

interface KnownRoute {
  readonly form: RegExp;
  readonly methods: Set<string>;
}

/** Which methods an address has, for telling a wrong method from a wrong address. Asked only when nothing matched. */
export class KnownRoutes {
  private readonly routes = new Map<string, KnownRoute>();

  /** Before any route is there. */
  static listenTo(fastify: FastifyInstance): KnownRoutes {
    const known = new KnownRoutes();
    fastify.addHook('onRoute', (route) => known.add(route));
    return known;
  }

  allowed(url: string): string[] {
    const path = (url.split('?')[0] ?? '/').replace(/(.)\/$/, '$1');
    const found = [...this.routes.values()].filter(({ form }) => form.test(path));
    return [...new Set(found.flatMap(({ methods }) => [...methods]))].sort();
  }

  private add({ url, method }: Pick<RouteOptions, 'url' | 'method'>): void {
    // A wildcard knows every address and so tells nothing of one.
    if (url.includes('*')) return;
    const known = this.routes.get(url) ?? { form: formOf(url), methods: new Set<string>() };
    for (const one of [method].flat()) known.methods.add(one);
    this.routes.set(url, known);
  }
}

function formOf(url: string): RegExp {
  const parts = url.split('/').map((part) => {
    if (part.startsWith(':')) return '[^/]+';
    return part.replace(/[.*+?^${}()|[\]\\]/g, '\\$&');
  });
  return new RegExp(`^${parts.join('/')}$`);
}

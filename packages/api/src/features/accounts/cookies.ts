import type { FastifyReply, FastifyRequest } from 'fastify';

type WithCookies = FastifyRequest & { cookies: Record<string, string | undefined> };
type SetsCookies = FastifyReply & {
  setCookie(name: string, value: string, options: object): FastifyReply;
  clearCookie(name: string, options: object): FastifyReply;
};

/** One cookie that no script reads and no other site sends. */
export class SecretCookie {
  private readonly name: string;

  constructor(
    name: string,
    private readonly path: string,
    private readonly https: boolean,
  ) {
    this.name = https ? `__Secure-${name}` : name;
  }

  read(request: FastifyRequest): string | null {
    return (request as WithCookies).cookies[this.name] ?? null;
  }

  write(reply: FastifyReply, value: string, days: number): void {
    (reply as SetsCookies).setCookie(this.name, value, { ...this.options, maxAge: days * 86_400 });
  }

  clear(reply: FastifyReply): void {
    (reply as SetsCookies).clearCookie(this.name, this.options);
  }

  private get options() {
    return { path: this.path, httpOnly: true, sameSite: 'strict' as const, secure: this.https };
  }
}

import type { Response } from 'supertest';

/** The attributes of a cookie that an answer sets; `pair` is what a browser sends back. */
export interface SetCookie {
  readonly name: string;
  readonly value: string;
  readonly pair: string;
  readonly attributes: readonly string[];
}

export function cookiesOf(response: Response): SetCookie[] {
  const lines = (response.headers['set-cookie'] ?? []) as unknown as string[];
  return lines.map((line) => {
    const [pair = '', ...attributes] = line.split('; ');
    const at = pair.indexOf('=');
    return { name: pair.slice(0, at), value: pair.slice(at + 1), pair, attributes };
  });
}

/** What a browser sends back of an answer's cookie. */
export function cookieOf(response: Response, name = 'rivetside-refresh'): string {
  const found = cookiesOf(response).find((cookie) => cookie.name === name);
  if (!found) throw new Error(`The answer sets no cookie ${name}`);
  return found.pair;
}

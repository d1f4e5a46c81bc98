import { delay, http, HttpResponse } from 'msw';
import { z } from 'zod';
import { makeMe } from '../testing/make-me';
import { server } from '../testing/server';
import { access } from './access';
import { api, Problem, queryString } from './api';

const problem = (status: number, more: object = {}) =>
  HttpResponse.json(
    { type: 'about:blank', title: 'Refused.', status, ...more },
    { status, headers: { 'content-type': 'application/problem+json' } },
  );
const signedIn = (accessToken: string) => ({ accessToken, expiresIn: 900, user: makeMe() });
const answer = z.strictObject({ ok: z.boolean() });

beforeEach(() => access.take(signedIn('old')));

/** Refuses every token but the new one, and counts what it was asked. */
function serverThatKnows(token: string) {
  const seen: { key: string | null; token: string | null }[] = [];
  server.use(
    http.post('*/api/things', ({ request: { headers } }) => {
      seen.push({ key: headers.get('idempotency-key'), token: headers.get('authorization') });
      return headers.get('authorization') === `Bearer ${token}`
        ? HttpResponse.json({ ok: true })
        : problem(401);
    }),
  );
  return seen;
}

it('renews a refused token once, and sends the same write with the same key', async () => {
  const seen = serverThatKnows('new');
  server.use(http.post('*/api/auth/refresh', () => HttpResponse.json(signedIn('new'))));
  await expect(api.post('/things', { body: {}, answer })).resolves.toEqual({ ok: true });
  expect(seen.map(({ token }) => token)).toEqual(['Bearer old', 'Bearer new']);
  expect(seen[0]!.key).toMatch(/^[0-9a-f]{32}$/);
  expect(seen[1]!.key).toBe(seen[0]!.key);
});

it('asks for one new token only, however many requests are refused at once', async () => {
  serverThatKnows('new');
  let asked = 0;
  server.use(
    http.post('*/api/auth/refresh', async () => {
      asked += 1;
      await delay(20);
      return HttpResponse.json(signedIn('new'));
    }),
  );
  await Promise.all([1, 2, 3].map(() => api.post('/things', { answer })));
  expect(asked).toBe(1);
});

it('waits when the session is lost, and goes on with the same write after the next sign-in', async () => {
  const seen = serverThatKnows('after sign-in');
  server.use(http.post('*/api/auth/refresh', () => problem(401)));
  const writing = api.post('/things', { body: { typed: 'kept' }, answer });
  await new Promise<void>((resolve) => access.onChange(() => access.isLost() && resolve()));
  expect(seen).toHaveLength(1);
  access.take(signedIn('after sign-in'));
  await expect(writing).resolves.toEqual({ ok: true });
  expect(access.isLost()).toBe(false);
  expect(seen[1]!.key).toBe(seen[0]!.key);
});

it('gives up what waits when somebody signs out instead', async () => {
  serverThatKnows('never');
  server.use(http.post('*/api/auth/refresh', () => problem(401)));
  const writing = api.post('/things', { answer }).catch((error: unknown) => error);
  await new Promise<void>((resolve) => access.onChange(() => access.isLost() && resolve()));
  access.drop();
  expect(await writing).toMatchObject({ status: 401 });
});

it('keeps the key that it is given', async () => {
  const seen = serverThatKnows('old');
  await api.post('/things', { key: 'kept-with-the-draft', answer });
  expect(seen[0]!.key).toBe('kept-with-the-draft');
});

it.each(['the network broke', 'the server was starting'])(
  'sends a write again, once, when %s',
  async (why) => {
    const keys: (string | null)[] = [];
    server.use(
      http.put('*/api/things', ({ request }) => {
        keys.push(request.headers.get('idempotency-key'));
        if (keys.length > 1) return HttpResponse.json({ ok: true });
        return why === 'the network broke' ? HttpResponse.error() : problem(503);
      }),
    );
    await expect(api.put('/things', { body: {}, answer })).resolves.toEqual({ ok: true });
    expect(keys).toHaveLength(2);
    expect(keys[1]).toBe(keys[0]);
  },
);

it('never repeats a write of a stranger, whose key the server does not keep', async () => {
  access.drop();
  let asked = 0;
  server.use(
    http.post('*/api/auth/sign-up', () => {
      asked += 1;
      return HttpResponse.error();
    }),
  );
  await expect(api.post('/auth/sign-up', { body: {} })).rejects.toMatchObject({ status: 0, isOffline: true });
  expect(asked).toBe(1);
});

it('tells a wrong password from a lost session', async () => {
  server.use(http.post('*/api/auth/sign-in', () => problem(401, { title: 'E-mail or password is wrong.' })));
  await expect(api.post('/auth/sign-in', { body: {} })).rejects.toThrow('E-mail or password is wrong.');
  expect(access.isLost()).toBe(false);
});

it('reads a refusal whole: what, why, and at which field', async () => {
  const errors = [{ path: 'layers.0.thickness', message: 'A sheet has a thickness.' }];
  server.use(
    http.get('*/api/things', () => problem(400, { detail: 'One field is wrong.', errors, extra: 7 })),
  );
  const refusal: unknown = await api.get('/things').catch((error: unknown) => error);
  expect(refusal).toBeInstanceOf(Problem);
  expect(refusal).toMatchObject({
    status: 400,
    title: 'Refused.',
    detail: 'One field is wrong.',
    errors,
    isOffline: false,
  });
  expect((refusal as Problem).problem['extra']).toBe(7);
});

it('has words for a refusal in another form', async () => {
  server.use(http.get('*/api/things', () => HttpResponse.html('<h1>Bad gateway</h1>', { status: 502 })));
  await expect(api.get('/things')).rejects.toMatchObject({
    status: 502,
    title: expect.stringContaining('kept'),
  });
});

it('refuses an answer that is not what was agreed', async () => {
  server.use(http.get('*/api/things', () => HttpResponse.json({ ok: 'yes' })));
  await expect(api.get('/things', { answer })).rejects.toMatchObject({
    title: 'The server answers in a newer form.',
  });
});

it('stops when it is told to, and does not call that a lost network', async () => {
  server.use(http.get('*/api/things', () => delay('infinite')));
  const stop = new AbortController();
  const reading = api.get('/things', { signal: stop.signal });
  stop.abort();
  await expect(reading).rejects.toMatchObject({ name: 'AbortError' });
});

it.each([
  [{}, ''],
  [{ a: undefined, b: null, c: [], d: '' }, ''],
  [
    { q: 'edge 0.25 AD3', state: ['open', 'advised'], mine: true },
    '?q=edge+0.25+AD3&state=open&state=advised&mine=true',
  ],
])('writes the query of %j as %j', (values, text) => expect(queryString(values)).toBe(text));

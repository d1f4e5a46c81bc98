import type { Response } from 'supertest';
import { PreparedReader } from '../../common/database/prepared-reader.js';
import { UnitOfWork } from '../../common/database/unit-of-work.js';
import { cookieOf, cookiesOf } from '../../testing/cookies.js';
import type { TestUser } from '../../testing/create-account.js';
import { startTestApp, type TestApp } from '../../testing/start-test-app.js';
import { AccountsJob } from './accounts.job.js';

const PASSWORD = 'maple copper lantern';
const DAY = 86_400_000;
const FIREFOX = 'Mozilla/5.0 (X11; Linux x86_64; rv:128.0) Gecko/20100101 Firefox/128.0';

let test: TestApp;
let wenna: TestUser;
beforeAll(async () => {
  test = await startTestApp();
});
afterAll(() => test.stop());
beforeEach(async () => {
  wenna = await test.create.user({ password: PASSWORD });
});

const signIn = (agent = FIREFOX) =>
  test.guest
    .post('/auth/sign-in')
    .set('user-agent', agent)
    .send({ email: wenna.email, password: PASSWORD })
    .expect(200);
const refresh = (cookie: string) => test.guest.post('/auth/refresh').set('cookie', cookie);
const bearer = ({ body }: Response) => `Bearer ${body.accessToken}`;
const meOf = (response: Response) => test.guest.get('/me').set('authorization', bearer(response));

describe('refreshing', () => {
  it.each([
    { what: 'no cookie', cookie: '' },
    { what: 'a made-up token', cookie: `rivetside-refresh=${'x'.repeat(43)}` },
    { what: 'an empty token', cookie: 'rivetside-refresh=' },
    { what: 'the cookie under another name', cookie: `refresh=${'x'.repeat(43)}` },
  ])('refuses $what', async ({ cookie }) => {
    await refresh(cookie).expect(401);
  });

  it('does not take a refresh token for an access token, nor the other way round', async () => {
    const signedIn = await signIn();
    const token = cookieOf(signedIn).split('=')[1]!;
    await test.guest.get('/me').set('authorization', `Bearer ${token}`).expect(401);
    await refresh(`rivetside-refresh=${signedIn.body.accessToken}`).expect(401);
  });

  it('gives a new access token, a new cookie and the same session', async () => {
    const first = await signIn();
    const second = await refresh(cookieOf(first)).expect(200);
    expect(second.body).toEqual({
      accessToken: expect.any(String),
      expiresIn: 900,
      user: first.body.user,
    });
    expect(cookieOf(second)).not.toBe(cookieOf(first));
    await meOf(first).expect(200);
    await meOf(second).expect(200);
    await refresh(cookieOf(second)).expect(200);
  });

  it('keeps only hashes of the tokens', async () => {
    const token = cookieOf(await signIn()).split('=')[1]!;
    const found = test.app
      .get(PreparedReader)
      .all('SELECT * FROM "refresh_tokens" WHERE "hash" = ? OR "sessionId" = ?', [token, token]);
    expect(found).toEqual([]);
  });

  it('ends the whole family when an old cookie comes again', async () => {
    const first = await signIn();
    const second = await refresh(cookieOf(first)).expect(200);
    const third = await refresh(cookieOf(second)).expect(200);
    const other = await signIn();
    const { headers } = await refresh(cookieOf(first)).expect(401);
    expect(headers['set-cookie']).toEqual([
      expect.stringMatching(/^rivetside-refresh=;.*Expires=Thu, 01 Jan 1970/),
    ]);
    for (const one of [first, second, third]) await meOf(one).expect(401);
    await refresh(cookieOf(third)).expect(401);
    await meOf(other).expect(200);
    await refresh(cookieOf(other)).expect(200);
  });

  it('gives the newer token to one of two that come at once, and then to neither', async () => {
    const first = await signIn();
    const answers = await Promise.all([refresh(cookieOf(first)), refresh(cookieOf(first))]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 401]);
    const winner = answers.find(({ status }) => status === 200)!;
    await refresh(cookieOf(winner)).expect(401);
  });

  it('ends after 30 days without use', async () => {
    const early = await signIn();
    const late = await signIn('another device');
    test.clock.advance(30 * DAY - 1_000);
    await refresh(cookieOf(early)).expect(200);
    test.clock.advance(1_000);
    await refresh(cookieOf(late)).expect(401);
  });

  it('ends after 90 days however much it is used', async () => {
    let latest: Response = await signIn();
    for (let day = 20; day <= 80; day += 20) {
      test.clock.advance(20 * DAY);
      latest = await refresh(cookieOf(latest)).expect(200);
    }
    test.clock.advance(10 * DAY);
    await refresh(cookieOf(latest)).expect(401);
    await meOf(latest).expect(401);
  });

  it('refuses a closed account', async () => {
    const first = await signIn();
    await test.app.get(UnitOfWork).runPrepared((db) => {
      db.run('UPDATE "users" SET "disabledAt" = ? WHERE "id" = ?', [test.clock.instant(), wenna.id]);
    });
    await meOf(first).expect(401);
    await refresh(cookieOf(first)).expect(401);
  });
});

describe('signing out', () => {
  it('answers 204 to whoever is not signed in', async () => {
    await test.guest.post('/auth/sign-out').expect(204);
    await test.guest.post('/auth/sign-out').set('authorization', 'Bearer nonsense').expect(204);
  });

  it.each([
    { by: 'the cookie', send: (one: Response) => ({ cookie: cookieOf(one) }) },
    { by: 'the access token', send: (one: Response) => ({ authorization: bearer(one) }) },
  ])('by $by ends the session at once and clears the cookie', async ({ send }) => {
    const [signedIn, other] = [await signIn(), await signIn()];
    const response = await test.guest.post('/auth/sign-out').set(send(signedIn)).expect(204);
    expect(cookiesOf(response).find(({ name }) => name === 'rivetside-refresh')?.value).toBe('');
    await meOf(signedIn).expect(401);
    await refresh(cookieOf(signedIn)).expect(401);
    await meOf(other).expect(200);
  });
});

describe('the list of sessions', () => {
  const list = (of: Response) => test.guest.get('/me/sessions').set('authorization', bearer(of)).expect(200);

  it('names the device of each and the one at hand, and no stranger’s', async () => {
    const stranger = await test.create.user();
    const here = await signIn();
    const { body } = await list(here);
    expect(body.nextCursor).toBeNull();
    expect(body.items).toHaveLength(2); // the one of `create.user` and this
    expect(body.items.filter(({ current }: { current: boolean }) => current)).toEqual([
      {
        id: expect.any(String),
        device: 'Firefox on Linux',
        createdAt: expect.any(String),
        lastUsedAt: expect.any(String),
        current: true,
      },
    ]);
    expect(JSON.stringify(body)).not.toContain(stranger.sessionId);
  });

  it('comes in pages, the last used first', async () => {
    const [first, here] = [await signIn(), await signIn()];
    await refresh(cookieOf(first)).expect(200);
    const ask = (query: string) => test.guest.get(`/me/sessions?${query}`).set('authorization', bearer(here));
    const page = await ask('limit=2').expect(200);
    const rest = await ask(`limit=2&cursor=${page.body.nextCursor}`).expect(200);
    const seen = [...page.body.items, ...rest.body.items] as { id: string; lastUsedAt: string }[];
    expect(new Set(seen.map(({ id }) => id)).size).toBe(3);
    expect(seen.map(({ lastUsedAt }) => lastUsedAt)).toEqual(
      seen
        .map(({ lastUsedAt }) => lastUsedAt)
        .sort()
        .reverse(),
    );
    expect(rest.body.nextCursor).toBeNull();
    await ask('limit=none').expect(400);
  });

  it('ends one of them at once', async () => {
    const [here, there] = [await signIn(), await signIn()];
    const { body } = await list(there);
    const id = body.items.find(({ current }: { current: boolean }) => current).id;
    const end = () => test.guest.delete(`/me/sessions/${id}`).set('authorization', bearer(here));
    await end().expect(204);
    await meOf(there).expect(401);
    await refresh(cookieOf(there)).expect(401);
    await end().expect(404);
    expect((await list(here)).body.items.map((one: { id: string }) => one.id)).not.toContain(id);
  });

  it('does not end a stranger’s and does not tell that it exists', async () => {
    const stranger = await test.create.user();
    const here = await signIn();
    await test.guest
      .delete(`/me/sessions/${stranger.sessionId}`)
      .set('authorization', bearer(here))
      .expect(404);
    await test.as(stranger).get('/me').expect(200);
  });

  it('ends every other one and keeps the one at hand', async () => {
    const stranger = await test.create.user();
    const [here, there] = [await signIn(), await signIn()];
    await test.guest.delete('/me/sessions').set('authorization', bearer(here)).expect(204);
    await meOf(there).expect(401);
    await test.as(wenna).get('/me').expect(401);
    await meOf(here).expect(200);
    await test.as(stranger).get('/me').expect(200);
  });
});

describe('what is forgotten', () => {
  it('drops sessions and links that ended long ago and people who never confirmed, and nothing that lives', async () => {
    const rows = (sql: string, id: string) => test.app.get(PreparedReader).all(sql, [id]).length;
    const ended = await signIn();
    await test.guest.post('/auth/sign-out').set('authorization', bearer(ended)).expect(204);
    const idle = await test.create.user({ emailConfirmedAt: null });
    await test.guest
      .post('/auth/sign-up')
      .send({ email: 'never@test.example', password: PASSWORD, name: 'Never Pressed' })
      .expect(202);
    const sessions = () => rows('SELECT 1 FROM "sessions" WHERE "userId" = ?', wenna.id);
    const people = (email: string) => rows('SELECT 1 FROM "users" WHERE "email" = ?', email);

    test.clock.advance(29 * DAY);
    await test.app.get(AccountsJob).forgetOld();
    expect([sessions(), people('never@test.example')]).toEqual([2, 1]);

    test.clock.advance(62 * DAY);
    const alive = await signIn();
    await test.app.get(AccountsJob).forgetOld();
    expect([sessions(), people('never@test.example')]).toEqual([1, 0]);
    expect(people(wenna.email)).toBe(1);
    expect(idle.id).toBeDefined();
    await meOf(alive).expect(200);
  });
});

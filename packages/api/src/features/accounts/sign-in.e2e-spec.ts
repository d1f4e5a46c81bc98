import { cookieOf, cookiesOf } from '../../testing/cookies.js';
import { readToken } from '../../testing/forge-token.js';
import { startTestApp, type TestApp } from '../../testing/start-test-app.js';

const PASSWORD = 'maple copper lantern';
const WRONG = 'maple copper lanterns';

describe('signing in', () => {
  let test: TestApp;
  beforeAll(async () => {
    // Behind a proxy, so that a test may come from any address.
    test = await startTestApp({ env: { TRUST_PROXY: '1' } });
  });
  afterAll(() => test.stop());

  let last = 0;
  const freshAddress = () => `198.51.${Math.floor((last += 1) / 250)}.${(last % 250) + 1}`;
  const signIn = (email: string, password = PASSWORD, from = freshAddress(), cookie = '') =>
    test.guest
      .post('/auth/sign-in')
      .set('x-forwarded-for', from)
      .set('cookie', cookie)
      .send({ email, password });
  const wrongTimes = async (times: number, email: string, from?: string) => {
    for (let n = 0; n < times; n += 1) await signIn(email, WRONG, from).expect(401);
  };

  it.each([
    { who: 'an unknown address', email: 'nobody@test.example', facts: null },
    { who: 'a wrong password', email: undefined, facts: { password: WRONG } },
    { who: 'an account without a password', email: undefined, facts: {} },
    {
      who: 'a closed account',
      email: undefined,
      facts: { password: PASSWORD, disabledAt: '2026-01-01T00:00:00.000Z' },
    },
  ])('refuses $who in the same words', async ({ email, facts }) => {
    const address = email ?? (await test.create.user(facts!)).email;
    const { body, headers } = await signIn(address).expect(401);
    expect(body).toEqual({
      type: 'about:blank',
      title: 'Not signed in',
      status: 401,
      detail: 'Address or password is not right.',
      instance: '/api/auth/sign-in',
    });
    expect(headers['set-cookie']).toBeUndefined();
  });

  it.each([
    { fault: 'nothing', body: {} },
    { fault: 'a list', body: [] },
    { fault: 'a password that is no text', body: { email: 'a@b.example', password: { $ne: '' } } },
    {
      fault: 'something else besides',
      body: { email: 'a@b.example', password: PASSWORD, role: 'siteAdmin' },
    },
  ])('refuses $fault as a fault of the request', async ({ body }) => {
    await test.guest.post('/auth/sign-in').send(body).expect(400);
  });

  it.each([
    { change: 'in other case', given: PASSWORD.toUpperCase() },
    { change: 'with a space after it', given: `${PASSWORD} ` },
    { change: 'cut short', given: PASSWORD.slice(0, -1) },
    { change: 'gone on with', given: `${PASSWORD}x` },
  ])('takes a password as it is typed: not $change', async ({ given }) => {
    const { email } = await test.create.user({ password: PASSWORD });
    await signIn(email, given).expect(401);
  });

  it('tells 128-character passwords apart at the last character', async () => {
    const long = 'maple copper '.repeat(10).slice(0, 127);
    const { email } = await test.create.user({ password: `${long}a` });
    await signIn(email, `${long}b`).expect(401);
    await signIn(email, `${long}a`).expect(200);
  });

  it('gives an access token for 15 minutes and who one is', async () => {
    const chapter = await test.create.chapter({ name: 'Moss Hill' });
    const user = await test.create.user({
      password: PASSWORD,
      name: 'Wenna Trevose',
      chapter,
      roles: ['builder', 'mentor'],
      disciplines: ['riveting'],
    });
    const { body } = await signIn(user.email).expect(200);
    expect(body).toEqual({
      accessToken: expect.any(String),
      expiresIn: 900,
      user: {
        id: user.id,
        name: 'Wenna Trevose',
        email: user.email,
        units: 'inch',
        zone: 'Europe/London',
        siteRole: null,
        memberships: [
          {
            chapterId: chapter.id,
            chapterName: 'Moss Hill',
            roles: ['builder', 'mentor'],
            disciplines: ['riveting'],
            status: 'active',
          },
        ],
      },
    });
    const { header, claims } = readToken(body.accessToken);
    expect(header).toEqual({ alg: 'HS256', typ: 'JWT' });
    expect(claims).toMatchObject({ iss: 'rivetside', aud: 'rivetside-api', sub: user.id, typ: 'access' });
    expect(Number(claims['exp']) - Number(claims['iat'])).toBe(900);
    const me = await test.guest.get('/me').set('authorization', `Bearer ${body.accessToken}`).expect(200);
    expect(me.body).toEqual(body.user);
  });

  it('keeps the refresh token from scripts, from other sites and from all but /api/auth', async () => {
    const { email } = await test.create.user({ password: PASSWORD });
    const response = await signIn(email).expect(200);
    const refresh = cookiesOf(response).find(({ name }) => name === 'rivetside-refresh')!;
    expect(refresh.attributes).toEqual(
      expect.arrayContaining(['HttpOnly', 'SameSite=Strict', 'Path=/api/auth', `Max-Age=${30 * 86_400}`]),
    );
    expect(Buffer.from(refresh.value, 'base64url')).toHaveLength(32);
    expect(JSON.stringify(response.body)).not.toContain(refresh.value);
    expect(response.headers['cache-control']).toBe('no-store');
  });

  it('never gives the same token twice', async () => {
    const { email } = await test.create.user({ password: PASSWORD });
    const answers = [await signIn(email).expect(200), await signIn(email).expect(200)];
    expect(new Set(answers.map(({ body }) => body.accessToken)).size).toBe(2);
    expect(new Set(answers.map((answer) => cookieOf(answer))).size).toBe(2);
  });

  it('ends the session that the same browser had, and only a session of the same account', async () => {
    const [wenna, jory] = [
      await test.create.user({ password: PASSWORD }),
      await test.create.user({ password: PASSWORD }),
    ];
    const first = await signIn(wenna.email).expect(200);
    const second = await signIn(wenna.email, PASSWORD, freshAddress(), cookieOf(first)).expect(200);
    await signIn(jory.email, PASSWORD, freshAddress(), cookieOf(second)).expect(200);
    const meWith = ({ body }: { body: { accessToken: string } }) =>
      test.guest.get('/me').set('authorization', `Bearer ${body.accessToken}`);
    await meWith(first).expect(401);
    await meWith(second).expect(200);
  });

  describe('holding off guessers', () => {
    it('refuses the eleventh try after ten wrong ones, right password or not, and says how long', async () => {
      const { email } = await test.create.user({ password: PASSWORD });
      const from = freshAddress();
      await wrongTimes(10, email, from);
      const { body, headers } = await signIn(email, PASSWORD, from).expect(429);
      expect(headers['content-type']).toMatch(/^application\/problem\+json/);
      expect(body.status).toBe(429);
      expect(Number(headers['retry-after'])).toBeGreaterThan(800);
      expect(Number(headers['retry-after'])).toBeLessThanOrEqual(900);
    });

    it('answers for an unknown address the same at the eleventh try', async () => {
      const from = freshAddress();
      await wrongTimes(10, 'nobody-at-all@test.example', from);
      await signIn('nobody-at-all@test.example', WRONG, from).expect(429);
    });

    it('does not lock out the owner from another address', async () => {
      const { email } = await test.create.user({ password: PASSWORD });
      const from = freshAddress();
      await wrongTimes(10, email, from);
      await signIn(email, WRONG, from).expect(429);
      await signIn(email).expect(200);
    });

    it('lets the owner in after a quarter of an hour', async () => {
      const { email } = await test.create.user({ password: PASSWORD });
      const from = freshAddress();
      await wrongTimes(10, email, from);
      test.clock.advance(15 * 60_000);
      await signIn(email, PASSWORD, from).expect(200);
    });

    it('forgives wrong tries after the right one', async () => {
      const { email } = await test.create.user({ password: PASSWORD });
      const from = freshAddress();
      for (let round = 0; round < 3; round += 1) {
        await wrongTimes(9, email, from);
        await signIn(email, PASSWORD, from).expect(200);
      }
    });

    it('lets no more than ten wrong tries through when they come at once', async () => {
      const { email } = await test.create.user({ password: PASSWORD });
      const from = freshAddress();
      const tries = await Promise.all(Array.from({ length: 25 }, () => signIn(email, WRONG, from)));
      expect(tries.filter(({ status }) => status === 401)).toHaveLength(10);
      expect(tries.filter(({ status }) => status === 429)).toHaveLength(15);
    });

    it('lets right passwords through however many come at once', async () => {
      const { email } = await test.create.user({ password: PASSWORD });
      const from = freshAddress();
      const tries = await Promise.all(Array.from({ length: 25 }, () => signIn(email, PASSWORD, from)));
      expect(tries.map(({ status }) => status)).toEqual(Array(25).fill(200));
    });

    it('counts an IPv6 network as one', async () => {
      const { email } = await test.create.user({ password: PASSWORD });
      for (let n = 1; n <= 10; n += 1) await signIn(email, WRONG, `2001:db8:1:2::${n}`).expect(401);
      await signIn(email, PASSWORD, '2001:db8:1:2::99').expect(429);
      await signIn(email, PASSWORD, '2001:db8:1:3::1').expect(200);
    });

    it('holds off strangers from everywhere, and not the browser that has been in before', async () => {
      const { email } = await test.create.user({ password: PASSWORD });
      const device = cookieOf(await signIn(email).expect(200), 'rivetside-device');
      for (let stranger = 0; stranger < 10; stranger += 1) await wrongTimes(10, email, freshAddress());
      await signIn(email, PASSWORD).expect(429);
      await signIn(email, PASSWORD, freshAddress(), device).expect(200);
    });

    it('counts a known browser too', async () => {
      const { email } = await test.create.user({ password: PASSWORD });
      const device = cookieOf(await signIn(email).expect(200), 'rivetside-device');
      for (let n = 0; n < 10; n += 1) await signIn(email, WRONG, freshAddress(), device).expect(401);
      await signIn(email, WRONG, freshAddress(), device).expect(429);
      await signIn(email).expect(200);
    });

    it('takes no browser for known by a cookie of another account or a made-up one', async () => {
      const [wenna, jory] = [
        await test.create.user({ password: PASSWORD }),
        await test.create.user({ password: PASSWORD }),
      ];
      const device = cookieOf(await signIn(jory.email).expect(200), 'rivetside-device');
      const from = freshAddress();
      await wrongTimes(10, wenna.email, from);
      await signIn(wenna.email, PASSWORD, from, device).expect(429);
      await signIn(wenna.email, PASSWORD, from, 'rivetside-device=abc.def').expect(429);
      await signIn(wenna.email, PASSWORD, from, 'rivetside-device=abc').expect(429);
    });

    it('holds off an address that tries many accounts', async () => {
      const from = freshAddress();
      const stuffed: string[] = [];
      for (let n = 0; n < 30; n += 1) stuffed.push((await test.create.user({ password: PASSWORD })).email);
      await Promise.all(stuffed.map((email) => wrongTimes(10, email, from)));
      const { email } = await test.create.user({ password: PASSWORD });
      await signIn(email, PASSWORD, from).expect(429);
    }, 60_000);
  });
});

describe('signing in under https', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await startTestApp({ env: { PUBLIC_URL: 'https://bench.example' } });
  });
  afterAll(() => test.stop());

  it('marks every cookie as secure, in its name too', async () => {
    const { email } = await test.create.user({ password: PASSWORD });
    const response = await test.guest.post('/auth/sign-in').send({ email, password: PASSWORD }).expect(200);
    const cookies = cookiesOf(response);
    expect(cookies.map(({ name }) => name)).toEqual([
      '__Secure-rivetside-refresh',
      '__Secure-rivetside-device',
    ]);
    for (const { attributes } of cookies)
      expect(attributes).toEqual(expect.arrayContaining(['Secure', 'HttpOnly', 'SameSite=Strict']));
    const cookie = cookieOf(response, '__Secure-rivetside-refresh');
    await test.guest.post('/auth/refresh').set('cookie', cookie).expect(200);
  });
});

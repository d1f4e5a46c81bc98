import type { Response } from 'supertest';
import { PreparedReader } from '../../common/database/prepared-reader.js';
import { cookieOf } from '../../testing/cookies.js';
import type { TestUser } from '../../testing/create-account.js';
import { mailsTo, tokenIn } from '../../testing/mails.js';
import { startTestApp, type TestApp } from '../../testing/start-test-app.js';

const PASSWORD = 'maple copper lantern';
const NEW = 'velvet anchor thunder';
const HOUR = 3_600_000;

let test: TestApp;
let wenna: TestUser;
beforeAll(async () => {
  test = await startTestApp({ env: { TRUST_PROXY: '1' } });
});
afterAll(() => test.stop());
beforeEach(async () => {
  wenna = await test.create.user({ password: PASSWORD, name: 'Wenna Trevose' });
});

let last = 0;
const freshAddress = () => `203.0.113.${(last += 1) % 250}`;
const post = (path: string, body: object, from = freshAddress()) =>
  test.guest.post(path).set('x-forwarded-for', from).send(body);
const signIn = (email: string, password: string) => post('/auth/sign-in', { email, password });
const forgot = (email: string, from?: string) => post('/auth/forgot-password', { email }, from);
const reset = (token: string, password = NEW) => post('/auth/reset-password', { token, password });
const auditOf = (id: string) =>
  test.app
    .get(PreparedReader)
    .all<{ what: string }>('SELECT "what" FROM "audit_trail" WHERE "subjectId" = ?', [id])
    .map(({ what }) => what);
async function resetToken(): Promise<string> {
  await forgot(wenna.email).expect(202);
  return tokenIn((await mailsTo(test, wenna.email))[0]);
}

describe('a forgotten password', () => {
  it('gets the same answer whether or not the address has an account', async () => {
    const [known, unknown] = [await forgot(wenna.email), await forgot('nobody@test.example')];
    expect([known.status, unknown.status]).toEqual([202, 202]);
    expect(known.body).toEqual(unknown.body);
    expect(await mailsTo(test, 'nobody@test.example')).toEqual([]);
    expect(await mailsTo(test, wenna.email)).toHaveLength(1);
  });

  it('writes as much for an unknown address as for a known one', async () => {
    const rows = () =>
      test.app.get(PreparedReader).get<{ n: number }>('SELECT count(*) AS n FROM "outbox"')!.n;
    const before = rows();
    await forgot(wenna.email).expect(202);
    const between = rows();
    await forgot('nobody@test.example').expect(202);
    expect([between - before, rows() - between]).toEqual([1, 1]);
  });

  it('sends a closed account nothing', async () => {
    const closed = await test.create.user({ disabledAt: test.clock.instant() });
    await forgot(closed.email).expect(202);
    expect(await mailsTo(test, closed.email)).toEqual([]);
  });

  it('is asked for five times in a quarter of an hour from one address, known or not', async () => {
    for (const email of [wenna.email, 'nobody@test.example']) {
      const from = freshAddress();
      for (let n = 0; n < 5; n += 1) await forgot(email, from).expect(202);
      const { headers } = await forgot(email, from).expect(429);
      expect(Number(headers['retry-after'])).toBeGreaterThan(0);
    }
  });

  it('sends one mailbox ten links an hour at most, from wherever they are asked for', async () => {
    for (let n = 0; n < 12; n += 1) await forgot(wenna.email).expect(202);
    expect(await mailsTo(test, wenna.email)).toHaveLength(10);
  });

  it('mails a link in both forms, over which no other mail header can be set', async () => {
    await forgot(wenna.email).expect(202);
    const [mail] = await mailsTo(test, wenna.email);
    const token = tokenIn(mail);
    expect(mail?.text).toContain(`${test.settings.publicUrl}/reset-password?token=${token}`);
    expect(mail?.html).toContain(`/reset-password?token=${token}`);
    expect(mail?.headers.get('auto-submitted')).toBe('auto-generated');
  });
});

describe('setting a password anew', () => {
  it.each([
    { fault: 'a made-up link', body: { token: 'x'.repeat(43), password: NEW }, path: 'token' },
    { fault: 'half a link', body: { token: 'x', password: NEW }, path: 'token' },
    { fault: 'a short password', body: { token: 'x'.repeat(43), password: 'short' }, path: 'password' },
  ])('refuses $fault at its field', async ({ body, path }) => {
    const { body: problem } = await post('/auth/reset-password', body).expect(400);
    expect(problem.errors).toEqual([expect.objectContaining({ path })]);
  });

  it('refuses a password that says the own name, and the link still works', async () => {
    const token = await resetToken();
    const { body } = await reset(token, 'wennatrevose1').expect(400);
    expect(body.errors).toEqual([expect.objectContaining({ path: 'password' })]);
    await reset(token).expect(204);
  });

  it('takes the new password, ends every session, and tells the owner', async () => {
    const before = await signIn(wenna.email, PASSWORD).expect(200);
    await reset(await resetToken()).expect(204);
    await test.as(wenna).get('/me').expect(401);
    await test.guest.get('/me').set('authorization', `Bearer ${before.body.accessToken}`).expect(401);
    await test.guest.post('/auth/refresh').set('cookie', cookieOf(before)).expect(401);
    await signIn(wenna.email, PASSWORD).expect(401);
    await signIn(wenna.email, NEW).expect(200);
    expect((await mailsTo(test, wenna.email))[0]?.subject).toBe('Your password was changed');
    expect(auditOf(wenna.id)).toContain('password.reset');
  });

  it('works once, within an hour', async () => {
    const token = await resetToken();
    await reset(token).expect(204);
    await reset(token, PASSWORD).expect(400);
    const late = await resetToken();
    test.clock.advance(HOUR);
    await reset(late).expect(400);
  });

  it('takes one of two answers that come at once', async () => {
    const token = await resetToken();
    const answers = await Promise.all([reset(token), reset(token, PASSWORD)]);
    expect(answers.map(({ status }) => status).sort()).toEqual([204, 400]);
  });

  it('lets an earlier link work until one of them is used', async () => {
    const [first, second] = [await resetToken(), await resetToken()];
    await reset(first).expect(204);
    await reset(second, PASSWORD).expect(400);
  });

  it('does not take a link that was mailed for something else', async () => {
    await post('/auth/sign-up', { email: 'jory@test.example', password: PASSWORD, name: 'Jory' }).expect(202);
    await reset(tokenIn((await mailsTo(test, 'jory@test.example'))[0])).expect(400);
    await post('/auth/confirm-email', { token: await resetToken() }).expect(400);
  });

  it('confirms the address of whoever never pressed the first link', async () => {
    const fresh = await test.create.user({ emailConfirmedAt: null, password: PASSWORD });
    await forgot(fresh.email).expect(202);
    await reset(tokenIn((await mailsTo(test, fresh.email))[0])).expect(204);
    await signIn(fresh.email, NEW).expect(200);
  });

  it('holds off whoever sends made-up links', async () => {
    const from = freshAddress();
    const send = () => post('/auth/confirm-email', { token: 'x'.repeat(43) }, from);
    for (let n = 0; n < 60; n += 1) await send().expect(400);
    await send().expect(429);
    await post('/auth/reset-password', { token: 'x'.repeat(43), password: NEW }, from).expect(429);
  });
});

describe('changing the password', () => {
  const change = (body: object, who: TestUser = wenna) => test.as(who).post('/me/password').send(body);

  it('refuses a guest', async () => {
    await post('/me/password', { password: PASSWORD, newPassword: NEW }).expect(401);
  });

  it.each([
    { fault: 'a wrong password', body: { password: NEW, newPassword: NEW }, path: 'password' },
    { fault: 'no password', body: { newPassword: NEW }, path: 'password' },
    { fault: 'a short new one', body: { password: PASSWORD, newPassword: 'short' }, path: 'newPassword' },
    {
      fault: 'a new one that everybody guesses',
      body: { password: PASSWORD, newPassword: 'qwertyuiopas' },
      path: 'newPassword',
    },
  ])('refuses $fault at its field', async ({ body, path }) => {
    const { body: problem } = await change(body).expect(400);
    expect(problem.errors).toEqual([expect.objectContaining({ path })]);
    await signIn(wenna.email, PASSWORD).expect(200);
  });

  it('takes the new one, keeps this session, ends the others, tells the owner, and kills mailed links', async () => {
    const link = await resetToken();
    const other = await signIn(wenna.email, PASSWORD).expect(200);
    await change({ password: PASSWORD, newPassword: NEW }).expect(204);
    await test.as(wenna).get('/me').expect(200);
    await test.guest.get('/me').set('authorization', `Bearer ${other.body.accessToken}`).expect(401);
    await signIn(wenna.email, PASSWORD).expect(401);
    await signIn(wenna.email, NEW).expect(200);
    expect((await mailsTo(test, wenna.email))[0]?.subject).toBe('Your password was changed');
    await reset(link).expect(400);
    expect(auditOf(wenna.id)).toContain('password.changed');
  });

  it('holds off whoever found a session open and guesses the password', async () => {
    for (let n = 0; n < 10; n += 1) await change({ password: NEW, newPassword: NEW }).expect(400);
    await change({ password: PASSWORD, newPassword: NEW }).expect(429);
    await test.as(wenna).post('/me/email').send({ password: PASSWORD, email: 'x@test.example' }).expect(429);
    const other = await test.create.user({ password: PASSWORD });
    await change({ password: PASSWORD, newPassword: NEW }, other).expect(204);
  });
});

describe('changing the address', () => {
  let made = 0;
  const fresh = () => `moved${(made += 1)}@test.example`;
  const ask = (email: string, password = PASSWORD, who: TestUser = wenna) =>
    test.as(who).post('/me/email').send({ email, password });
  const confirm = (token: string) => post('/auth/confirm-email', { token });
  const emailOf = ({ body }: Response): string => body.email as string;

  it.each([
    { fault: 'a wrong password', body: { email: 'new@test.example', password: NEW }, path: 'password' },
    { fault: 'what is no address', body: { email: 'new', password: PASSWORD }, path: 'email' },
  ])('refuses $fault at its field', async ({ body, path }) => {
    const { body: problem } = await test.as(wenna).post('/me/email').send(body).expect(400);
    expect(problem.errors).toEqual([expect.objectContaining({ path })]);
  });

  it('counts once the link in the new mailbox was pressed, and tells the old one', async () => {
    const email = fresh();
    await ask(email).expect(202);
    expect(emailOf(await test.as(wenna).get('/me'))).toBe(wenna.email);
    await confirm(tokenIn((await mailsTo(test, email))[0])).expect(204);
    expect(emailOf(await test.as(wenna).get('/me'))).toBe(email);
    expect((await mailsTo(test, wenna.email))[0]?.subject).toBe('Your account has a new address');
    await signIn(wenna.email, PASSWORD).expect(401);
    await signIn(email, PASSWORD).expect(200);
    expect(auditOf(wenna.id)).toContain('email.changed');
  });

  it('does not tell that an address has an account, and mails nobody', async () => {
    const other = await test.create.user();
    const [taken, free] = [await ask(other.email).expect(202), await ask(fresh()).expect(202)];
    expect(taken.body).toEqual(free.body);
    expect(await mailsTo(test, other.email)).toEqual([]);
  });

  it('refuses the link when the address has got an account meanwhile', async () => {
    const email = fresh();
    await ask(email).expect(202);
    const token = tokenIn((await mailsTo(test, email))[0]);
    await test.create.user({ email });
    const { body } = await confirm(token).expect(400);
    expect(body.errors).toEqual([
      { path: 'token', message: 'This address has an account of its own by now.' },
    ]);
    expect(emailOf(await test.as(wenna).get('/me'))).toBe(wenna.email);
  });

  it('is not kept from an address by somebody who signed up with it and never confirmed', async () => {
    const email = fresh();
    await post('/auth/sign-up', { email, password: NEW, name: 'Squatter' }).expect(202);
    await ask(email).expect(202);
    await confirm(tokenIn((await mailsTo(test, email))[0])).expect(204);
    await signIn(email, NEW).expect(401);
    await signIn(email, PASSWORD).expect(200);
  });

  it('goes to the address that was typed last', async () => {
    const [mistyped, right] = [fresh(), fresh()];
    await ask(mistyped).expect(202);
    await ask(right).expect(202);
    await confirm(tokenIn((await mailsTo(test, mistyped))[0])).expect(400);
    await confirm(tokenIn((await mailsTo(test, right))[0])).expect(204);
  });

  it('kills a link for a new password that went to the old address', async () => {
    const link = await resetToken();
    const email = fresh();
    await ask(email).expect(202);
    await confirm(tokenIn((await mailsTo(test, email))[0])).expect(204);
    await reset(link).expect(400);
  });
});

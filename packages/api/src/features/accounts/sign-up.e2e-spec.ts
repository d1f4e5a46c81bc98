import { PreparedReader } from '../../common/database/prepared-reader.js';
import { startTestApp, type TestApp } from '../../testing/start-test-app.js';
import { mailsTo, tokenIn } from '../../testing/mails.js';

const PASSWORD = 'maple copper lantern';
const HOUR = 3_600_000;

describe('signing up', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.stop());

  let made = 0;
  const someone = () => {
    made += 1;
    return { email: `new${made}@test.example`, password: PASSWORD, name: 'Wenna Trevose' };
  };
  const signUp = (body: object) => test.guest.post('/auth/sign-up').send(body);
  const confirm = (token: string) => test.guest.post('/auth/confirm-email').send({ token });
  const signIn = (email: string, password = PASSWORD) =>
    test.guest.post('/auth/sign-in').send({ email, password });

  it.each([
    { fault: 'no address', change: { email: undefined }, path: 'email' },
    { fault: 'an address without a place', change: { email: 'wenna' }, path: 'email' },
    { fault: 'two addresses', change: { email: 'a@b.example,c@d.example' }, path: 'email' },
    {
      fault: 'an address with a line break',
      change: { email: 'a@b.example\r\nBcc: x@y.example' },
      path: 'email',
    },
    { fault: 'eleven characters', change: { password: 'abcdefghijk' }, path: 'password' },
    { fault: '129 characters', change: { password: 'abc '.repeat(33).slice(0, 129) }, path: 'password' },
    { fault: 'a password that everybody guesses', change: { password: 'password1234' }, path: 'password' },
    { fault: 'the own name as password', change: { password: 'wennatrevose' }, path: 'password' },
    { fault: 'no name', change: { name: ' ' }, path: 'name' },
    { fault: 'a name over two lines', change: { name: 'Wenna\r\nBcc: x@y.example' }, path: 'name' },
    { fault: 'a role of its own choice', change: { siteRole: 'siteAdmin' }, path: '' },
  ])('refuses $fault at its field', async ({ change, path }) => {
    const { body } = await signUp({ ...someone(), ...change }).expect(400);
    expect(body.errors).toEqual([expect.objectContaining({ path, message: expect.any(String) })]);
    expect(body.errors[0].message).not.toMatch(/invalid|expected|zod/i);
  });

  it('takes a password of 12 and one of 128 characters', async () => {
    await signUp({ ...someone(), password: 'qz7 lamp tin' }).expect(202);
    await signUp({ ...someone(), password: 'maple copper '.repeat(10).slice(0, 128) }).expect(202);
  });

  it('lets nobody in before the link was pressed, and sends whoever knows the password the link again', async () => {
    const wenna = someone();
    await signUp(wenna).expect(202);
    const { body } = await signIn(wenna.email).expect(403);
    expect(body.detail).toMatch(/Confirm your address/);
    expect(await mailsTo(test, wenna.email)).toHaveLength(2);
    await signIn(wenna.email, 'another password').expect(401);
  });

  it('opens the account by the mailed link, once', async () => {
    const wenna = someone();
    await signUp(wenna).expect(202);
    const [mail] = await mailsTo(test, wenna.email);
    await confirm(tokenIn(mail)).expect(204);
    const { body } = await signIn(wenna.email).expect(200);
    expect(body.user).toMatchObject({
      name: wenna.name,
      email: wenna.email,
      memberships: [],
      siteRole: null,
    });
    const { body: again } = await confirm(tokenIn(mail)).expect(400);
    expect(again.errors).toEqual([expect.objectContaining({ path: 'token' })]);
  });

  it('refuses a link after two days, and one that was made up', async () => {
    const wenna = someone();
    await signUp(wenna).expect(202);
    const token = tokenIn((await mailsTo(test, wenna.email))[0]);
    test.clock.advance(48 * HOUR);
    await confirm(token).expect(400);
    await confirm('x'.repeat(43)).expect(400);
  });

  it('answers for an address that has an account as for any other, and mails its owner', async () => {
    const owner = await test.create.user({ name: 'Jory Pascoe' });
    const fresh = someone();
    const taken = await signUp({ ...fresh, email: owner.email }).expect(202);
    const free = await signUp(fresh).expect(202);
    expect(taken.body).toEqual(free.body);
    const [mail, ...more] = await mailsTo(test, owner.email);
    expect(more).toEqual([]);
    expect(mail?.subject).toBe('You already have an account');
    expect(mail?.text).toContain('Jory Pascoe');
    expect(mail?.text).not.toContain('token=');
    await signIn(owner.email).expect(401);
  });

  it('knows an address in other case as the same one', async () => {
    const wenna = someone();
    await signUp(wenna).expect(202);
    await confirm(tokenIn((await mailsTo(test, wenna.email))[0])).expect(204);
    await signUp({ ...wenna, email: wenna.email.toUpperCase() }).expect(202);
    expect((await mailsTo(test, wenna.email))[0]?.subject).toBe('You already have an account');
    await signIn(` ${wenna.email.toUpperCase()} `).expect(200);
  });

  describe('with an address that is another’s', () => {
    const THEIRS = 'velvet anchor thunder';

    it.each([
      { order: 'before its owner does', first: THEIRS, second: PASSWORD, ownersMail: 0 },
      { order: 'after its owner did', first: PASSWORD, second: THEIRS, ownersMail: 1 },
    ])('$order never sets the owner’s password', async ({ first, second, ownersMail }) => {
      const owner = someone();
      await signUp({ ...owner, password: first }).expect(202);
      await mailsTo(test, owner.email);
      await signUp({ ...owner, password: second }).expect(202);
      const mails = await mailsTo(test, owner.email);
      await confirm(tokenIn(mails[ownersMail])).expect(204);
      await signIn(owner.email, THEIRS).expect(401);
      await signIn(owner.email, PASSWORD).expect(200);
      await confirm(tokenIn(mails[1 - ownersMail])).expect(400);
    });
  });

  it('sends one mailbox ten mails an hour at most and answers on as before', async () => {
    const wenna = someone();
    const answers = [];
    for (let n = 0; n < 12; n += 1) answers.push((await signUp(wenna).expect(202)).body);
    expect(new Set(answers.map((answer) => JSON.stringify(answer))).size).toBe(1);
    expect(await mailsTo(test, wenna.email)).toHaveLength(10);
  });

  it('does not tell of a disabled account', async () => {
    const closed = await test.create.user({ disabledAt: test.clock.instant() });
    await signUp({ ...someone(), email: closed.email }).expect(202);
    expect(await mailsTo(test, closed.email)).toEqual([]);
  });

  it('keeps no secret in the outbox once the mail is sent', async () => {
    const wenna = someone();
    await signUp(wenna).expect(202);
    await mailsTo(test, wenna.email);
    const rows = test.app
      .get(PreparedReader)
      .all('SELECT "text", "html" FROM "outbox" WHERE "to" = ?', [wenna.email]);
    expect(rows).toEqual([{ text: '', html: '' }]);
  });
});

import { setTimeout as wait } from 'node:timers/promises';
import { Logger } from '@nestjs/common';
import { startTestApp, type TestApp } from '../../testing/start-test-app.js';

describe('the log', () => {
  let test: TestApp;
  let lines: string[];
  const start = async (level: string) => {
    lines = [];
    test = await startTestApp({ env: { LOG_LEVEL: level }, log: { write: (line) => void lines.push(line) } });
  };
  afterEach(() => test.stop());
  const logged = () => lines.map((line) => JSON.parse(line) as Record<string, unknown>);
  const refusals = () => logged().filter(({ msg }) => msg === 'refused');

  it('tells of each refusal with the request it belongs to, as one line of JSON', async () => {
    await start('info');
    await test.guest.get('/me?token=secret-in-query').set('x-request-id', 'edge-1').expect(401);
    await test.guest.get('/nowhere').expect(404);
    expect(refusals()).toEqual([
      expect.objectContaining({
        level: 'info',
        time: expect.stringMatching(/^\d{4}-\d\d-\d\dT/),
        requestId: 'edge-1',
        method: 'GET',
        path: '/api/me',
        status: 401,
      }),
      expect.objectContaining({ path: '/api/nowhere', status: 404 }),
    ]);
    expect(lines.every((line) => line.endsWith('\n') && !line.slice(0, -1).includes('\n'))).toBe(true);
  });

  it('names who was refused', async () => {
    await start('info');
    const somebody = await test.create.user();
    await test.as(somebody).get('/chapters/018f0000-0000-7000-8000-000000000000/members').expect(403);
    expect(refusals()).toEqual([expect.objectContaining({ userId: somebody.id, status: 403 })]);
  });

  it('never holds a password, a token or a cookie, however it comes', async () => {
    await start('trace');
    const secrets = ['hunter2-hunter2', 'tok-1234567890'];
    const somebody = await test.create.user();
    const token = test.tokenOf(somebody);
    await test.guest
      .post('/auth/sign-in')
      .set('cookie', `rivetside-refresh=${secrets[1]}`)
      .send({ email: 'x@test.example', password: secrets[0] });
    await test.guest
      .post('/auth/sign-in')
      .set('content-type', 'application/json')
      .send(`{"password": "${secrets[0]}`);
    await test.guest.post('/auth/reset-password').send({ token: secrets[1], password: secrets[0] });
    await test.as(somebody).get('/me').expect(200);
    new Logger('Test').log(
      { a: { password: secrets[0], cookie: secrets[1] }, token: secrets[1] },
      'handed over',
    );
    expect(lines.length).toBeGreaterThan(4);
    expect(lines.filter((line) => [...secrets, token].some((secret) => line.includes(secret)))).toEqual([]);
  });

  it('tells of each answer at debug only', async () => {
    await start('debug');
    await test.guest.get('/health/live').expect(200);
    // Told after the answer has gone out.
    await wait(20);
    expect(logged()).toContainEqual(
      expect.objectContaining({ level: 'debug', msg: 'answered', path: '/api/health/live', status: 200 }),
    );
    await test.stop();
    await start('info');
    await test.guest.get('/health/live').expect(200);
    await wait(20);
    expect(logged().filter(({ msg }) => msg === 'answered')).toEqual([]);
  });
});

import { startTestApp } from '../../testing/start-test-app.js';

describe('the demo sign-ins', () => {
  it('are nothing where there is no demo, even for an address of it', async () => {
    const test = await startTestApp({ env: { DEMO: '0' } });
    await test.create.user({ email: 'builder@demo.rivetside.example' });
    await test.guest.get('/demo').expect(404);
    await test.stop();
  });

  it('are nothing where the demo was not loaded', async () => {
    const test = await startTestApp({ env: { DEMO: '1' } });
    await test.create.user();
    await test.guest.get('/demo').expect(404);
    await test.stop();
  });

  it('say who somebody would be', async () => {
    const test = await startTestApp({ env: { DEMO: '1' } });
    const chapter = await test.create.chapter({ name: 'Moss Hill' });
    await test.create.user({
      email: 'mentor@demo.rivetside.example',
      name: 'Ada',
      chapter,
      roles: ['mentor', 'builder'],
    });
    await test.create.user({ email: 'site@demo.rivetside.example', name: 'Sam', siteRole: 'siteAdmin' });
    const { body } = await test.guest.get('/demo').expect(200);
    expect(body).toEqual([
      { email: 'mentor@demo.rivetside.example', name: 'Ada', as: 'mentor and builder, Moss Hill' },
      { email: 'site@demo.rivetside.example', name: 'Sam', as: 'site admin' },
    ]);
    await test.stop();
  });
});

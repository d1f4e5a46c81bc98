import { startTestApp, type TestApp } from './start-test-app.js';

describe('the started test app', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.stop());

  it('refuses a guest where somebody must be signed in', async () => {
    await test.guest.get('/me').expect(401);
  });

  it('knows the person of `as` with the membership made for them', async () => {
    const chapter = await test.create.chapter({ name: 'Moss Hill' });
    const mentor = await test.create.user({ chapter, roles: ['mentor'], disciplines: ['riveting'] });
    const { body } = await test.as(mentor).get('/me').expect(200);
    expect(body).toMatchObject({
      id: mentor.id,
      memberships: [
        { chapterId: chapter.id, chapterName: 'Moss Hill', roles: ['mentor'], disciplines: ['riveting'] },
      ],
    });
  });
});

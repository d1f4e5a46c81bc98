import type { TestUser } from '../../testing/create-account.js';
import { startTestApp, type TestApp } from '../../testing/start-test-app.js';

describe('one’s own account', () => {
  let test: TestApp;
  let wenna: TestUser;
  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.stop());
  beforeEach(async () => {
    wenna = await test.create.user({ name: 'Wenna Trevose' });
  });

  it.each(['get', 'patch'] as const)('%s refuses a guest', async (method) => {
    await test.guest[method]('/me').expect(401);
  });

  it('shows what the account holds and nothing that opens it', async () => {
    const { body } = await test.as(wenna).get('/me').expect(200);
    expect(body).toEqual({
      id: wenna.id,
      name: 'Wenna Trevose',
      email: wenna.email,
      units: 'inch',
      zone: 'Europe/London',
      memberships: [],
      siteRole: null,
    });
  });

  it.each([
    { fault: 'units of its own', body: { units: 'furlong' }, path: 'units' },
    { fault: 'a zone that is none', body: { zone: 'Bodmin/Moor' }, path: 'zone' },
    { fault: 'an empty name', body: { name: '  ' }, path: 'name' },
    { fault: 'a name with a web address', body: { name: 'www.cheap.example' }, path: 'name' },
    { fault: 'a name with markup', body: { name: '<b>Wenna</b>' }, path: 'name' },
    { fault: 'a role', body: { siteRole: 'siteAdmin' }, path: '' },
    { fault: 'another address', body: { email: 'new@test.example' }, path: '' },
    { fault: 'another id', body: { id: 'x' }, path: '' },
  ])('refuses $fault', async ({ body, path }) => {
    const { body: problem } = await test.as(wenna).patch('/me').send(body).expect(400);
    expect(problem.errors).toEqual([expect.objectContaining({ path })]);
    expect((await test.as(wenna).get('/me')).body.name).toBe('Wenna Trevose');
  });

  it('changes what is sent and keeps the rest', async () => {
    const { body } = await test.as(wenna).patch('/me').send({ units: 'mm' }).expect(200);
    expect(body).toMatchObject({ units: 'mm', name: 'Wenna Trevose', zone: 'Europe/London' });
    await test.as(wenna).patch('/me').send({ name: ' Wenna Pascoe ', zone: 'America/Denver' }).expect(200);
    expect((await test.as(wenna).get('/me')).body).toMatchObject({
      units: 'mm',
      name: 'Wenna Pascoe',
      zone: 'America/Denver',
    });
  });

  it('takes an empty change for none', async () => {
    const { body } = await test.as(wenna).patch('/me').send({}).expect(200);
    expect(body.name).toBe('Wenna Trevose');
  });

  it('changes nobody else', async () => {
    const other = await test.create.user({ name: 'Jory Pascoe' });
    await test.as(wenna).patch('/me').send({ name: 'Someone Else' }).expect(200);
    expect((await test.as(other).get('/me')).body.name).toBe('Jory Pascoe');
  });
});

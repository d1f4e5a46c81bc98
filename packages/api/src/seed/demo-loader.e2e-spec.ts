import type { Question, QuestionRow } from '@rivetside/shared';
import supertest from 'supertest';
import { startTestApp, type TestApp, type TestClient } from '../testing/start-test-app.js';
import { DemoLoader } from './demo-loader.js';
import { readSeedWorld } from './seed-world.js';

const world = readSeedWorld();
let test: TestApp;
let steward: (path: string) => Promise<Record<string, never> & { items: never[] }>;

async function signedIn(email: string): Promise<string> {
  const credentials = { email: `${email}@demo.rivetside.example`, password: 'rivetside-demo' };
  const { body } = await test.guest.post('/auth/sign-in').send(credentials).expect(200);
  return (body as { accessToken: string }).accessToken;
}

beforeAll(async () => {
  test = await startTestApp({ env: { DEMO: '1' } });
  test.clock.set('2026-12-01T12:00:00.000Z');
  await test.app.get(DemoLoader).loadIntoEmpty();
  const token = await signedIn('steward');
  steward = async (path) => {
    const { body } = await supertest(test.server)
      .get(`/api${path}`)
      .set('authorization', `Bearer ${token}`)
      .expect(200);
    return body;
  };
}, 120_000);
afterAll(() => test.stop());

const all = async (): Promise<QuestionRow[]> => (await steward('/questions?limit=100')).items;

describe('the demo world', () => {
  it('has the whole kit', async () => {
    const kitId = (await steward('/kits')).items[0]!['id'];
    const sections = (await steward(`/kits/${kitId}/sections`)).items as {
      id: string;
      code: string;
      critical: boolean;
    }[];
    expect(
      sections
        .filter(({ critical }) => critical)
        .map(({ code }) => code)
        .sort(),
    ).toEqual(['CTR', 'ELV', 'FLP', 'WSP']);
    const whole = await Promise.all(sections.map(({ id }) => steward(`/sections/${id}`)));
    const count = (what: string) =>
      whole.reduce((sum, section) => sum + (section[what] as unknown[]).length, 0);
    expect([sections.length, count('steps'), count('parts'), count('holeLines')]).toEqual([10, 80, 74, 29]);
  });

  it('has every question in the state that its story ends with', async () => {
    const states = Object.fromEntries((await all()).map(({ number, state }) => [number, state]));
    expect(states).toEqual(Object.fromEntries(world.questions.map(({ number, state }) => [number, state])));
  });

  it('numbers what happened without a gap, in the order of time, and keeps the time of the story', async () => {
    for (const { id, askedAt } of await all()) {
      const { events } = (await steward(`/questions/${id}`)) as unknown as Question;
      expect(events.map(({ seq }) => seq)).toEqual(events.map((_, at) => at + 1));
      expect(events.map(({ at }) => at)).toEqual(events.map(({ at }) => at).sort());
      expect(events[0]).toMatchObject({ type: 'asked', at: askedAt });
    }
  });

  it('shows every photo with its caption', async () => {
    const sheets = await Promise.all((await all()).map(({ id }) => steward(`/questions/${id}`)));
    const photos = (sheets as unknown as Question[]).flatMap((one) => [
      ...one.photos,
      ...(one.completion?.photos ?? []),
    ]);
    expect(photos.map(({ caption }) => caption).sort()).toEqual(
      world.questions.flatMap((one) => one.photos.map(({ caption }) => caption)).sort(),
    );
    for (const { urls } of photos) await supertest(test.server).get(urls.thumb).expect(200);
  });

  it('writes what was carried out into the record, with its basis', async () => {
    const done = (await all()).filter(({ state }) => state === 'carriedOut');
    for (const { id } of done) {
      const { completion } = (await steward(`/questions/${id}`)) as unknown as Question;
      expect(completion?.entryId).toBeTruthy();
    }
    expect(done.length).toBeGreaterThan(5);
  });

  it('is found by what its people would type', async () => {
    const hits = (await steward(`/search?q=${encodeURIComponent('doubler hole 7 AD5')}`)).items as {
      id: string;
    }[];
    const asked = (await all()).find(({ number }) => number === 'STB-Q-001')!;
    expect(hits.map(({ id }) => id)).toContain(asked.id);
  });

  it('lets each of the nine sign in', async () => {
    const { body } = await test.guest.get('/demo').expect(200);
    const people = (body as { email: string }[]).map(({ email }) => email.split('@')[0]!);
    expect(people).toEqual([
      'builder',
      'builder2',
      'mentor',
      'mentor2',
      'mentor3',
      'admin',
      'admin2',
      'steward',
      'site',
    ]);
    for (const name of people) await signedIn(name);
  });

  it('is loaded once', async () => {
    await test.app.get(DemoLoader).loadIntoEmpty();
    expect(await all()).toHaveLength(world.questions.length);
  });

  it('goes on from its numbers', async () => {
    const token = await signedIn('builder');
    const as = (path: string): ReturnType<TestClient['post']> =>
      supertest(test.server).post(`/api${path}`).set('authorization', `Bearer ${token}`);
    const like = (await all()).find(({ number }) => number.startsWith('STB-Q'))!;
    const asked = {
      kitId: like.kitId,
      sectionId: like.section!.id,
      chapterId: (await test.guest.get('/demo')) && (await chapterOf(token)),
      audience: 'chapter',
      discipline: 'sheetMetal',
      mishap: 'fit',
      title: 'The tip rib stands proud',
      body: 'By the thickness of a card.',
    };
    const { body } = await as('/questions').send(asked).expect(201);
    const last = world.questions.filter(({ section }) => section === 'STB').length;
    expect(body.number).toBe(`STB-Q-${String(last + 1).padStart(3, '0')}`);
  });
});

async function chapterOf(token: string): Promise<string> {
  const { body } = await supertest(test.server)
    .get('/api/me')
    .set('authorization', `Bearer ${token}`)
    .expect(200);
  return (body as { memberships: { chapterId: string }[] }).memberships[0]!.chapterId;
}

import { fitCheck, type Question, type QuestionRow } from '@rivetside/shared';
import sharp from 'sharp';
import supertest from 'supertest';
import { PreparedReader } from '../common/database/prepared-reader.js';
import { SearchIndexService } from '../features/search/search-index.service.js';
import { startTestApp, type TestApp, type TestClient } from '../testing/start-test-app.js';
import { DemoLoader } from './demo-loader.js';
import { readSeedWorld } from './seed-world.js';

const world = readSeedWorld();
type Read = <T = { items: never[] }>(path: string) => Promise<T>;
let test: TestApp;
let steward: Read;

async function signedIn(email: string): Promise<string> {
  const credentials = { email: `${email}@demo.rivetside.example`, password: 'rivetside-demo' };
  const { body } = await test.guest.post('/auth/sign-in').send(credentials).expect(200);
  return (body as { accessToken: string }).accessToken;
}

const count = (from: string) =>
  test.app.get(PreparedReader).get<{ n: number }>(`SELECT count(*) AS "n" FROM ${from}`, [])!.n;

beforeAll(async () => {
  test = await startTestApp({ env: { DEMO: '1' } });
  test.clock.set('2026-12-01T12:00:00.000Z');
}, 60_000);
afterAll(() => test.stop());

describe('a load that breaks off', () => {
  it('leaves nothing behind, so that the next start loads all of it', async () => {
    const index = test.app.get(SearchIndexService);
    const addIn = index.addIn.bind(index);
    let left = 300;
    index.addIn = async (tx, doc) => {
      left -= 1;
      if (left === 0) throw new Error('the lights went out');
      await addIn(tx, doc);
    };
    await expect(test.app.get(DemoLoader).loadIntoEmpty()).rejects.toThrow('the lights went out');
    index.addIn = addIn;
    expect(['"users"', '"kits"', '"questions"', '"photos"', '"search_docs"'].map(count)).toEqual([
      0, 0, 0, 0, 0,
    ]);
  }, 60_000);
});

const readingAs =
  (token: string): Read =>
  async <T>(path: string) => {
    const request = supertest(test.server).get(`/api${path}`).set('authorization', `Bearer ${token}`);
    return (await request.expect(200)).body as T;
  };
const all = async () => (await steward<{ items: QuestionRow[] }>('/questions?limit=100')).items;

describe('the demo world', () => {
  beforeAll(async () => {
    await test.app.get(DemoLoader).loadIntoEmpty();
    steward = readingAs(await signedIn('steward'));
  }, 60_000);

  it('has the whole kit', async () => {
    const [{ id: kitId }] = (await steward<{ items: [{ id: string }] }>('/kits')).items;
    type Listed = { id: string; code: string; critical: boolean };
    const sections = (await steward<{ items: Listed[] }>(`/kits/${kitId}/sections`)).items;
    const critical = sections.filter((section) => section.critical).map(({ code }) => code);
    expect(critical.sort()).toEqual(['CTR', 'ELV', 'FLP', 'WSP']);
    type Whole = Record<'steps' | 'parts' | 'holeLines', unknown[]>;
    const whole = await Promise.all(sections.map(({ id }) => steward<Whole>(`/sections/${id}`)));
    const sum = (what: keyof Whole) => whole.reduce((total, section) => total + section[what].length, 0);
    expect([sections.length, sum('steps'), sum('parts'), sum('holeLines')]).toEqual([10, 80, 74, 29]);
  });

  it('has every question in the state that its story ends with', async () => {
    const states = Object.fromEntries((await all()).map(({ number, state }) => [number, state]));
    expect(states).toEqual(Object.fromEntries(world.questions.map(({ number, state }) => [number, state])));
  });

  it('numbers what happened without a gap, in the order of time, and keeps the time of the story', async () => {
    for (const { id, askedAt } of await all()) {
      const { events } = await steward<Question>(`/questions/${id}`);
      expect(events.map(({ seq }) => seq)).toEqual(events.map((_, at) => at + 1));
      expect(events.map(({ at }) => at)).toEqual(events.map(({ at }) => at).sort());
      expect(events[0]).toMatchObject({ type: 'asked', at: askedAt });
    }
  });

  it('froze with every question and fix what the check itself says of the card', async () => {
    for (const { id } of await all()) {
      const { holeCard, fitCheck: frozen, fixes } = await steward<Question>(`/questions/${id}`);
      const check = holeCard ? fitCheck(holeCard) : null;
      expect(frozen).toEqual(check && (JSON.parse(JSON.stringify(check)) as object));
      for (const { kind, check: own } of fixes)
        expect(own?.kind ?? null).toBe(check?.remedies.find((remedy) => remedy.kind === kind)?.kind ?? null);
    }
  });

  it('shows every photo with its caption, in all its sizes', async () => {
    const sheets = await Promise.all((await all()).map(({ id }) => steward<Question>(`/questions/${id}`)));
    const photos = sheets.flatMap((one) => [...one.photos, ...(one.completion?.photos ?? [])]);
    expect(photos.map(({ caption }) => caption).sort()).toEqual(
      world.questions.flatMap((one) => one.photos.map(({ caption }) => caption)).sort(),
    );
    for (const { urls, width, height } of photos) {
      const sizes = { thumb: 320, screen: width, full: width };
      for (const [size, wide] of Object.entries(sizes)) {
        const { body } = await supertest(test.server)
          .get(urls[size as keyof typeof sizes])
          .expect(200);
        const shown = await sharp(body as Buffer).metadata();
        expect([shown.width, shown.height]).toEqual([wide, Math.round((height * wide) / width)]);
      }
    }
  }, 60_000);

  it('writes what was carried out into the record, with its basis and what was measured', async () => {
    const asked = world.questions.find(({ number }) => number === 'STB-Q-001')!;
    const builder = readingAs(await signedIn('builder'));
    const [{ id }] = (await builder<{ items: [{ id: string }] }>('/builds')).items;
    type Entry = {
      questionNumber?: string;
      title: string;
      doneAt: string;
      lines: { label: string; text: string }[];
    };
    const entries = (await builder<{ items: Entry[] }>(`/builds/${id}/entries?limit=100`)).items;
    const entry = entries.find(({ title }) => title === asked.fixes[0]!.summary)!;
    const line = (label: string) => entry.lines.find((one) => one.label === label)?.text;
    expect(entry.doneAt).toBe(new Date(asked.completion!.at).toISOString());
    expect(line('Basis')).toContain(`stamp ${asked.fixes[0]!.endorsements[0]!.stampNumber}`);
    expect(line('Measured')).toContain(`final drill ${asked.completion!.asDone.finalDrill}`);
    const carried = world.questions.filter(({ completion }) => completion);
    expect(count(`"entries" WHERE "kind" = 'fix'`)).toBe(carried.length);
    expect(count(`"completions" WHERE "entryId" IS NOT NULL`)).toBe(carried.length);
  });

  it('has told on their sheets, once, which stamps ran out', () => {
    const past = world.questions
      .flatMap(({ fixes }) => fixes.flatMap(({ endorsements }) => endorsements))
      .filter(({ goodUntil, withdrawn }) => goodUntil < '2026-12-01' && !withdrawn);
    expect(past.length).toBeGreaterThan(0);
    expect(count(`"question_events" WHERE "type" = 'endorsementExpired'`)).toBe(past.length);
    expect(count('"endorsements" WHERE "expiredAt" IS NOT NULL')).toBe(past.length);
  });

  it.each([
    ['0.387 AD6', 'CTR-Q-001'],
    ['doubler hole 7 AD5', 'STB-Q-001'],
    ['HL-FLP-1', 'FLP-Q-001'],
    ['rust freckles horn', 'ELV-Q-002'],
  ])('is found by what its people would type: %s', async (typed, number) => {
    type Hit = { id: string; questionId?: string };
    const { items } = await steward<{ items: Hit[] }>(`/search?q=${encodeURIComponent(typed)}`);
    const asked = (await all()).find((one) => one.number === number)!;
    expect(items.flatMap(({ id, questionId }) => [id, questionId])).toContain(asked.id);
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
      chapterId: await chapterOf(token),
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

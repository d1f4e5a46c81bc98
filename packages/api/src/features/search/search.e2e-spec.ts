import type { SearchHit } from '@rivetside/shared';
import type { TestUser } from '../../testing/create-account.js';
import type { Bench } from '../../testing/create-question.js';
import { startTestApp, type TestApp } from '../../testing/start-test-app.js';

let test: TestApp;
let bench: Bench;
beforeAll(async () => {
  test = await startTestApp();
  bench = await test.create.bench();
});
afterAll(() => test.stop());

const search = async (user: TestUser, q: string): Promise<SearchHit[]> => {
  const { body } = await test.as(user).get('/search').query({ q }).expect(200);
  return body.items as SearchHit[];
};
const ids = (hits: SearchHit[]) => hits.map(({ id }) => id);

describe('search', () => {
  it('is for who is signed in, and wants something to look for', async () => {
    await test.guest.get('/search?q=spar').expect(401);
    const { body } = await test.as(bench.builder).get('/search?q=%20').expect(400);
    expect(body.errors[0]).toEqual({ path: 'q', message: 'Type what to look for.' });
  });

  it.each([
    '"',
    '*',
    'a AND',
    'NEAR(',
    '-',
    "'; DROP TABLE questions; --",
    'words:x',
    '( ) " ^',
    '\u0000',
    '🔩',
  ])('takes %j for words, never for a command', async (q) => {
    await test.as(bench.builder).get('/search').query({ q }).expect(200);
  });

  it('finds a drill, a decimal and a rivet however they are typed', async () => {
    const question = await test.create.question(bench, {
      title: 'Edge 0.387 too near after #30',
      body: 'MS20470AD6-5 was called for.',
    });
    for (const q of ['.387', '0,387', '0.387 AD6', 'No 30', '470 AD6', '#30 edge'])
      expect(ids(await search(bench.builder, q))).toContain(question.id);
    expect(ids(await search(bench.builder, '0.388'))).not.toContain(question.id);
  });

  it('falls back to any of the words where nothing holds them all', async () => {
    const question = await test.create.question(bench, { title: 'Bellcrank arm is bent at the root' });
    expect(ids(await search(bench.builder, 'bellcrank unobtainium'))).toEqual([question.id]);
    expect(await search(bench.builder, 'unobtainium')).toEqual([]);
  });

  it('marks what was found without a tag of its own making', async () => {
    await test.create.question(bench, { title: 'Gusset <b>cracked</b> at the corner' });
    const [hit] = await search(bench.builder, 'gusset');
    expect(hit!.title).toEqual([
      { text: 'Gusset', hit: true },
      { text: ' <b>cracked</b> at the corner', hit: false },
    ]);
  });

  it('folds what was said under a question into one hit', async () => {
    const question = await test.create.question(bench, { title: 'Longeron sits proud of the skin' });
    for (const body of ['The longeron again', 'Longeron measured: 0.05 proud'])
      await test.as(bench.mentors[0]).post(`/questions/${question.id}/messages`).send({ body }).expect(201);
    expect(ids(await search(bench.builder, 'longeron'))).toEqual([question.id]);
  });

  it('shows nothing of another chapter, and shows what is shared with the kit', async () => {
    const own = await test.create.bench();
    const hidden = await test.create.question(own, { title: 'Turnbarrel thread is stripped' });
    const shared = await test.create.question(own, { title: 'Turnbarrel wire is short', audience: 'kit' });
    const other = await test.create.chapter();
    await test.create.link(own.kit, other);
    const neighbour = await test.create.user({ chapter: other, roles: ['builder'] });
    expect(ids(await search(neighbour, 'turnbarrel'))).toEqual([shared.id]);
    expect(ids(await search(bench.builder, 'turnbarrel'))).toEqual([]);
    expect(ids(await search(own.builder, 'turnbarrel')).sort()).toEqual([hidden.id, shared.id].sort());
    const guest = await test.create.user();
    expect(await search(guest, 'turnbarrel')).toEqual([]);
  });

  it('says first when the stamp of an answer was withdrawn', async () => {
    const question = await test.create.question(bench, { title: 'Torque tube bushing is oval' });
    const fix = await test.create.fix(bench.mentors[0], question);
    const stamp = await test.create.stamp(bench.mentors[1], fix);
    await test
      .as(bench.mentors[1])
      .post(`/endorsements/${stamp.id}/withdrawal`)
      .send({ reason: 'New drawing' })
      .expect(200);
    const [hit] = await search(bench.builder, 'bushing');
    expect(hit).toMatchObject({ id: question.id, state: 'advised', standing: 'withdrawn' });
  });

  it('comes in pages that neither miss nor repeat one', async () => {
    const own = await test.create.bench();
    for (let made = 0; made < 5; made += 1)
      await test.create.question(own, { title: `Fairlead number ${made} rubs` });
    const seen: string[] = [];
    let cursor: string | null = '';
    while (cursor !== null) {
      const query: Record<string, string> = { q: 'fairlead', limit: '2', ...(cursor ? { cursor } : {}) };
      const { body } = await test.as(own.builder).get('/search').query(query).expect(200);
      seen.push(...ids(body.items as SearchHit[]));
      cursor = body.nextCursor as string | null;
    }
    expect(seen).toHaveLength(5);
    expect(new Set(seen).size).toBe(5);
  });
});

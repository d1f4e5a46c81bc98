import type { Question } from '@rivetside/shared';
import { newId } from '../../common/ids.js';
import type { Bench } from '../../testing/create-question.js';
import { aHoleCard, KIT_LIMITS } from '../../testing/create-question.js';
import { startTestApp, type TestApp } from '../../testing/start-test-app.js';

let test: TestApp;
let bench: Bench;
beforeAll(async () => {
  test = await startTestApp();
  bench = await test.create.bench();
});
afterAll(() => test.stop());

describe('asking', () => {
  it('is not for guests, nor for who is no builder there', async () => {
    const asked = test.create.asking(bench);
    await test.guest.post('/questions').send(asked).expect(401);
    await test.as(bench.mentors[0]).post('/questions').send(asked).expect(403);
    const elsewhere = await test.create.bench();
    await test.as(elsewhere.builder).post('/questions').send(asked).expect(403);
  });

  it.each([
    ['title', { title: 'Hole' }],
    ['body', { body: ' ' }],
    ['holeCard.layers.0.thickness', { holeCard: cardWithThickness(-1) }],
    ['sectionId', { sectionId: newId() }],
    ['holeLineId', { holeLineId: newId() }],
    ['buildId', { buildId: newId() }],
    ['discipline', { discipline: 'welding' }],
  ])('names the field %s that cannot be', async (path, facts) => {
    const asked = { ...test.create.asking(bench), ...facts };
    const { body } = await test.as(bench.builder).post('/questions').send(asked).expect(400);
    expect(body.errors.map((fault: { path: string }) => fault.path)).toContain(path);
  });

  it('refuses a hole that the line does not have', async () => {
    const line = await test.create.holeLine(bench.section, { count: 22, repeats: 2 });
    const asked = test.create.asking(bench, { holeLineId: line.id, holes: [{ repeat: 3, hole: 23 }] });
    const { body } = await test.as(bench.builder).post('/questions').send(asked).expect(400);
    expect(body.errors).toEqual([
      { path: 'holes.0.hole', message: 'This line has 22 holes.' },
      { path: 'holes.0.repeat', message: 'This line is there 2 times.' },
    ]);
  });

  it('pins the question, checks its card and numbers it by section', async () => {
    const own = await test.create.bench();
    const first = await test.create.question(own);
    const second = await test.create.question(own);
    expect(first).toMatchObject({
      number: `${own.section.code}-Q-001`,
      state: 'open',
      waits: { for: 'firstFix' },
      buildId: own.build.id,
      serial: own.build.serial,
      section: { id: own.section.id, critical: false },
      headline: { text: expect.any(String) },
    });
    expect(first.fitCheck!.remedies.map(({ kind }) => kind)).toContain('cleanUp');
    expect(first.events.map(({ type, seq }) => [type, seq])).toEqual([['asked', 1]]);
    expect(second.number).toBe(`${own.section.code}-Q-002`);
  });

  it('puts the kit maker’s limits of the hole line on the card', async () => {
    const limits = KIT_LIMITS;
    const line = await test.create.holeLine(bench.section, { limits });
    const { holeCard } = await test.create.question(bench, { holeLineId: line.id });
    expect(holeCard!.limits).toEqual(limits);
  });

  it('takes a question about the whole build', async () => {
    const { number, section } = await test.create.question(bench, {
      sectionId: null,
      holeCard: null,
      mishap: 'paperwork',
    });
    expect(number).toBe('KIT-Q-001');
    expect(section).toBeNull();
  });

  it('is done once, however often the same is sent', async () => {
    const asked = test.create.asking(bench);
    const send = () => test.as(bench.builder).post('/questions').set('Idempotency-Key', 'ask-1').send(asked);
    const [one, two] = [await send().expect(201), await send().expect(201)];
    expect(two.body.id).toBe(one.body.id);
    expect(two.body.number).toBe(one.body.number);
  });
});

function cardWithThickness(thickness: number) {
  const card = aHoleCard();
  return { ...card, layers: [{ ...card.layers[0]!, thickness }, card.layers[1]!] };
}

describe('seeing', () => {
  let question: Question;
  beforeAll(async () => {
    question = await test.create.question(bench);
  });

  it('hides a question of another chapter on every address of it', async () => {
    const { builder, mentors } = await test.create.bench();
    await test.as(builder).get(`/questions/${question.id}`).expect(404);
    await test.as(builder).get(`/questions/${question.id}/events`).expect(404);
    await test.as(builder).get(`/questions/similar?questionId=${question.id}`).expect(404);
    await test.as(builder).post(`/questions/${question.id}/messages`).send({ body: 'Hello' }).expect(404);
    await test.as(mentors[0]).post(`/questions/${question.id}/fixes`).send({}).expect(400);
    const { body } = await test.as(builder).get('/questions').expect(200);
    expect(body.items).toEqual([]);
  });

  it('shows it to the kit’s other chapters when it is shared with the kit, and their mentors advise', async () => {
    const shared = await test.create.question(bench, { audience: 'kit' });
    const other = await test.create.chapter();
    await test.create.link(bench.kit, other);
    const mentor = await test.create.user({
      chapter: other,
      roles: ['mentor'],
      disciplines: ['riveting'],
      stampNumber: 'M-31',
    });
    await test.as(mentor).get(`/questions/${shared.id}`).expect(200);
    await test.as(mentor).get(`/questions/${question.id}`).expect(404);
    await test.create.fix(mentor, shared);
  });

  it('shows it to nobody whose membership is only asked for or suspended', async () => {
    for (const status of ['requested', 'suspended'] as const) {
      const person = await test.create.user({ chapter: bench.chapter, roles: ['builder'], status });
      await test.as(person).get(`/questions/${question.id}`).expect(404);
    }
  });

  it('lets the keepers of kit and site read, not talk', async () => {
    const steward = await test.create.user({ siteRole: 'steward' });
    await test.as(steward).get(`/questions/${question.id}`).expect(200);
    await test.as(steward).post(`/questions/${question.id}/messages`).send({ body: 'Hello' }).expect(403);
  });
});

describe('the list', () => {
  it('pages through everything once, in each order', async () => {
    const own = await test.create.bench();
    for (let made = 0; made < 5; made += 1) await test.create.question(own);
    for (const sort of ['activity', 'newest', 'waiting']) {
      const seen: string[] = [];
      let cursor: string | null = '';
      while (cursor !== null) {
        const address: string = `/questions?limit=2&sort=${sort}${cursor ? `&cursor=${cursor}` : ''}`;
        const { body } = await test.as(own.builder).get(address).expect(200);
        seen.push(...body.items.map(({ id }: { id: string }) => id));
        cursor = body.nextCursor;
      }
      expect(new Set(seen).size).toBe(5);
      expect(seen).toHaveLength(5);
    }
  });

  it.each(['limit=0', 'cursor=nonsense', 'state=done', 'kitId=1', 'likes=1'])('refuses %s', async (query) => {
    await test.as(bench.builder).get(`/questions?${query}`).expect(400);
  });

  it('filters by place, state, discipline and whose it is, and finds by number', async () => {
    const own = await test.create.bench();
    const part = await test.create.part(own.section);
    const asked = await test.create.question(own, { partId: part.id, title: 'Edge 0.387 too near for AD6' });
    await test.create.question(own);
    const found = async (query: string) => {
      const { body } = await test.as(own.builder).get(`/questions?${query}`).expect(200);
      return body.items.map(({ id }: { id: string }) => id);
    };
    expect(await found(`partId=${part.id}`)).toEqual([asked.id]);
    expect(await found(`sectionId=${own.section.id}`)).toHaveLength(2);
    expect(await found('state=endorsed')).toEqual([]);
    expect(await found('discipline=riveting&mine=true')).toHaveLength(2);
    expect(await found('q=0.387 AD6')).toEqual([asked.id]);
    expect(
      await test
        .as(own.mentors[0])
        .get('/questions?mine=true')
        .then(({ body }) => body.items),
    ).toEqual([]);
  });

  it('marks what was written since one had it open, and only that', async () => {
    const own = await test.create.bench();
    const { id } = await test.create.question(own);
    const unread = async () => {
      const { body } = await test.as(own.builder).get('/questions').expect(200);
      return body.items[0].unread;
    };
    await test.as(own.builder).put(`/questions/${id}/seen`).send({ seq: 1 }).expect(204);
    expect(await unread()).toBe(false);
    await test
      .as(own.mentors[0])
      .post(`/questions/${id}/messages`)
      .send({ body: 'Measure the other side.' })
      .expect(201);
    expect(await unread()).toBe(true);
    await test.as(own.builder).put(`/questions/${id}/seen`).send({ seq: 2 }).expect(204);
    expect(await unread()).toBe(false);
  });
});

describe('bench talk', () => {
  it('keeps every line in order, numbered without a gap under a rush', async () => {
    const own = await test.create.bench();
    const { id } = await test.create.question(own);
    const lines = Array.from({ length: 40 }, (_, at) => `line ${at}`);
    await Promise.all(
      lines.map((body) =>
        test.as(own.mentors[0]).post(`/questions/${id}/messages`).send({ body }).expect(201),
      ),
    );
    const { body } = await test.as(own.builder).get(`/questions/${id}/events?after=1`).expect(200);
    expect(body.items.map(({ seq }: { seq: number }) => seq)).toEqual(lines.map((_, at) => at + 2));
    expect(new Set(body.items.map(({ data }: { data: { body: string } }) => data.body))).toEqual(
      new Set(lines),
    );
    expect(body.lastSeq).toBe(41);
  });

  it('goes back in pages and forward by number', async () => {
    const own = await test.create.bench();
    const { id } = await test.create.question(own);
    for (const body of ['one', 'two', 'three'])
      await test.as(own.builder).post(`/questions/${id}/messages`).send({ body }).expect(201);
    const before = await test.as(own.builder).get(`/questions/${id}/events?before=4&limit=2`).expect(200);
    expect(before.body.items.map(({ seq }: { seq: number }) => seq)).toEqual([2, 3]);
    const after = await test.as(own.builder).get(`/questions/${id}/events?after=1&limit=2`).expect(200);
    expect(after.body).toMatchObject({ nextCursor: '3', lastSeq: 4 });
  });

  it('refuses an empty line at its field', async () => {
    const { id } = await test.create.question(bench);
    const { body } = await test
      .as(bench.builder)
      .post(`/questions/${id}/messages`)
      .send({ body: '  ' })
      .expect(400);
    expect(body.errors).toEqual([{ path: 'body', message: 'Write a line first.' }]);
  });
});

describe('withdrawing', () => {
  it('is the asker’s, with a reason, once', async () => {
    const { id } = await test.create.question(bench);
    await test
      .as(bench.mentors[0])
      .post(`/questions/${id}/withdrawal`)
      .send({ reason: 'Not needed' })
      .expect(403);
    await test.as(bench.builder).post(`/questions/${id}/withdrawal`).send({}).expect(400);
    const { body } = await test
      .as(bench.builder)
      .post(`/questions/${id}/withdrawal`)
      .send({ reason: 'Wrong hole measured' })
      .expect(200);
    expect(body).toMatchObject({ state: 'withdrawn', withdrawn: { reason: 'Wrong hole measured' } });
    await test.as(bench.builder).post(`/questions/${id}/withdrawal`).send({ reason: 'Again' }).expect(409);
    await test.as(bench.builder).post(`/questions/${id}/messages`).send({ body: 'Still here?' }).expect(409);
  });
});

describe('met before', () => {
  it('shows what lies at the same place first, and says what is alike and what differs', async () => {
    const own = await test.create.bench();
    const part = await test.create.part(own.section);
    const there = await test.create.question(own, { partId: part.id });
    await test.create.question(own, { title: 'Something else altogether here' });
    const asked = {
      sectionId: own.section.id,
      partId: part.id,
      holeCard: { ...aHoleCard(), rivet: { head: 'universal', alloy: 'AD', dash: 5 } },
    };
    const { body } = await test.as(own.builder).post('/questions/similar').send(asked).expect(200);
    expect(body.items[0]).toMatchObject({
      question: { id: there.id },
      alikeIn: ['part', 'section', 'rivet head'],
      differsIn: ['rivet size'],
    });
  });
});

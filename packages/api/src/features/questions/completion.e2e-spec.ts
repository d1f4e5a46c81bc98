import type { Entry, Fix, Question } from '@rivetside/shared';
import type { Bench } from '../../testing/create-question.js';
import { startTestApp, type TestApp } from '../../testing/start-test-app.js';

let test: TestApp;
let bench: Bench;
beforeAll(async () => {
  test = await startTestApp();
  bench = await test.create.bench();
});
afterAll(() => test.stop());

const advised = async (on = bench): Promise<{ question: Question; fix: Fix }> => {
  const question = await test.create.question(on);
  return { question, fix: await test.create.fix(on.mentors[0], question) };
};
const asDone = {
  finalDrill: '#21',
  edgeDistances: [0.398, 0.402],
  shopHead: { width: 0.238, height: 0.079 },
  rivetLengthDash: 5,
  readings: [{ what: 'hole after reaming', value: 0.159, unit: 'in', u: 0.001 }],
};

describe('carrying out', () => {
  it('waits for a stamp, and says what is missing', async () => {
    const { question, fix } = await advised();
    const done = { fixId: fix.id, asDone, minutes: 40 };
    const { body } = await test
      .as(bench.builder)
      .post(`/questions/${question.id}/completion`)
      .send(done)
      .expect(409);
    expect(body).toMatchObject({ detail: 'This fix still needs a stamp.', current: { state: 'advised' } });
  });

  it('waits for two in a critical section', async () => {
    const critical = await test.create.bench({ critical: true });
    const { question, fix } = await advised(critical);
    await test.create.stamp(critical.mentors[1], fix, { basis: 'handbook' });
    const done = { fixId: fix.id, asDone, minutes: 40 };
    const { body } = await test
      .as(critical.builder)
      .post(`/questions/${question.id}/completion`)
      .send(done)
      .expect(409);
    expect(body.detail).toBe(
      'This fix still needs two stamps, none on experience: this section is critical.',
    );
  });

  it('is the builder’s and the crew’s alone', async () => {
    const { question, fix } = await advised();
    await test.create.stamp(bench.mentors[1], fix);
    const done = { fixId: fix.id, asDone, minutes: 40 };
    await test.as(bench.mentors[0]).post(`/questions/${question.id}/completion`).send(done).expect(403);
    const neighbour = await test.create.user({ chapter: bench.chapter, roles: ['builder'] });
    await test.as(neighbour).post(`/questions/${question.id}/completion`).send(done).expect(403);
    const helper = await test.create.user({ chapter: bench.chapter, roles: ['builder'] });
    await test.create.crew(bench.build, helper);
    await test.as(helper).post(`/questions/${question.id}/completion`).send(done).expect(201);
  });

  it.each([
    ['minutes', { minutes: 1.5 }],
    ['fixId', { fixId: '01890000-0000-7000-8000-000000000000' }],
    ['asDone.shopHead.width', { asDone: { shopHead: { width: -1, height: 0.08 } } }],
  ])('names %s where it cannot be', async (path, facts) => {
    const { question, fix } = await advised();
    const { body } = await test
      .as(bench.builder)
      .post(`/questions/${question.id}/completion`)
      .send({ fixId: fix.id, asDone, minutes: 40, ...facts })
      .expect(400);
    expect(body.errors[0].path).toBe(path);
  });

  it('is checked again, stands in the record, and what was not ticked becomes an open item', async () => {
    const own = await test.create.bench();
    const { question, fix } = await advised(own);
    await test.create.stamp(own.mentors[1], fix, { basis: 'drawingNote', conditions: ['Prime both layers'] });
    const done = {
      fixId: fix.id,
      asDone,
      minutes: 40,
      conditionsMet: ['Prime both layers'],
      helpers: ['Bo'],
      note: 'Went well.',
    };
    const { body } = await test
      .as(own.builder)
      .post(`/questions/${question.id}/completion`)
      .send(done)
      .expect(201);
    const sheet = body as Question;
    expect(sheet).toMatchObject({ state: 'carriedOut', waits: { for: 'nothing' } });
    expect(sheet.completion).toMatchObject({
      asDone,
      conditionsMet: ['Prime both layers'],
      conditionsLeft: ['Measure the driven head'],
    });
    expect(sheet.completion!.check!.checks.map(({ id }) => id)).toEqual(
      expect.arrayContaining(['finalHole', 'shopHead:width', 'shopHead:height', 'length']),
    );

    const entries = await test.as(own.builder).get(`/builds/${own.build.id}/entries`).expect(200);
    const [entry] = entries.body.items as Entry[];
    expect(entry).toMatchObject({
      kind: 'fix',
      questionId: question.id,
      minutes: 40,
      helpers: ['Bo'],
      title: fix.summary,
    });
    expect(entry!.lines.map(({ label }) => label)).toEqual([
      'Found',
      'Did',
      'Basis',
      'Measured',
      'Conditions met',
      'Left open',
      'Note',
    ]);
    expect(entry!.lines.find(({ label }) => label === 'Basis')!.text).toContain('stamp M-02');

    const items = await test.as(own.builder).get(`/builds/${own.build.id}/open-items`).expect(200);
    expect(items.body.items.map(({ text }: { text: string }) => text)).toEqual([
      `${question.number}: Measure the driven head`,
    ]);
  });

  it('happens once, also when it is sent twice at the same time', async () => {
    const { question, fix } = await advised();
    await test.create.stamp(bench.mentors[1], fix);
    const done = { fixId: fix.id, asDone: {}, minutes: 5 };
    const send = () => test.as(bench.builder).post(`/questions/${question.id}/completion`).send(done);
    const statuses = (await Promise.all([send(), send(), send()])).map(({ status }) => status).sort();
    expect(statuses).toEqual([201, 409, 409]);
    await test
      .as(bench.builder)
      .post(`/questions/${question.id}/withdrawal`)
      .send({ reason: 'Too late' })
      .expect(409);
  });

  it('is refused while a stamp is under review', async () => {
    const { question, fix } = await advised();
    await test.create.stamp(bench.mentors[1], fix);
    await test
      .as(bench.mentors[2])
      .post(`/fixes/${fix.id}/objections`)
      .send({ reason: 'Wrong alloy' })
      .expect(201);
    const done = { fixId: fix.id, asDone: {}, minutes: 5 };
    await test.as(bench.builder).post(`/questions/${question.id}/completion`).send(done).expect(409);
  });
});

describe('referring to the kit maker', () => {
  it('waits for the answer, files it with its reference, and returns to what the rest says', async () => {
    const { question } = await advised();
    const address = `/questions/${question.id}/referral`;
    const neighbour = await test.create.user({ chapter: bench.chapter, roles: ['builder'] });
    await test.as(neighbour).post(address).send({}).expect(403);
    await test
      .as(bench.builder)
      .post(`${address}/answer`)
      .send({ answer: 'Use AD5.', reference: 'R-1' })
      .expect(409);
    const referred = await test
      .as(bench.builder)
      .post(address)
      .send({ note: 'Please look at the edge.' })
      .expect(201);
    expect(referred.body).toMatchObject({ state: 'referred', waits: { for: 'kitMaker' } });
    await test.as(bench.mentors[0]).post(address).send({}).expect(409);
    await test
      .as(bench.builder)
      .post(`${address}/answer`)
      .send({ answer: 'Use AD5.', reference: ' ' })
      .expect(400);
    const { body } = await test
      .as(bench.mentors[0])
      .post(`${address}/answer`)
      .send({ answer: 'Use AD5.', reference: 'R-1' })
      .expect(200);
    expect(body).toMatchObject({
      state: 'advised',
      referral: { answered: { answer: 'Use AD5.', reference: 'R-1' } },
    });
  });
});

describe('the desk', () => {
  it('is a mentor’s, and shows what waits for them in their discipline, not their own', async () => {
    const own = await test.create.bench();
    const [first, second] = own.mentors;
    const open = await test.create.question(own);
    const { question: proposed } = await advised(own);
    await test.as(own.builder).get('/desk').expect(403);
    const deskOf = async (mentor: typeof first) => {
      const { body } = await test.as(mentor).get('/desk').expect(200);
      const ids = (rows: { id: string }[]) => rows.map(({ id }) => id);
      return { firstFix: ids(body.firstFix), stamp: ids(body.stamp), review: ids(body.review) };
    };
    expect(await deskOf(second)).toEqual({ firstFix: [open.id], stamp: [proposed.id], review: [] });
    expect(await deskOf(first)).toEqual({ firstFix: [open.id], stamp: [], review: [] });
    const painter = await test.create.user({
      chapter: own.chapter,
      roles: ['mentor'],
      disciplines: ['corrosion'],
    });
    expect(await deskOf(painter)).toEqual({ firstFix: [], stamp: [], review: [] });
  });
});

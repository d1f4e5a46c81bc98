import { type FitCheck, fitCheck, type Question } from '@rivetside/shared';
import {
  aFix,
  aHoleCard,
  aHoleCardNearAnEdge,
  type Bench,
  KIT_LIMITS,
} from '../../testing/create-question.js';
import { startTestApp, type TestApp } from '../../testing/start-test-app.js';

let test: TestApp;
let bench: Bench;
beforeAll(async () => {
  test = await startTestApp();
  bench = await test.create.bench();
});
afterAll(() => test.stop());

describe('proposing a fix', () => {
  it('is for a mentor of the discipline, in the chapter', async () => {
    const { id } = await test.create.question(bench);
    await test.guest.post(`/questions/${id}/fixes`).send(aFix()).expect(401);
    await test.as(bench.builder).post(`/questions/${id}/fixes`).send(aFix()).expect(403);
    const painter = await test.create.user({
      chapter: bench.chapter,
      roles: ['mentor'],
      disciplines: ['corrosion'],
    });
    await test.as(painter).post(`/questions/${id}/fixes`).send(aFix()).expect(403);
    const stranger = (await test.create.bench()).mentors[0];
    await test.as(stranger).post(`/questions/${id}/fixes`).send(aFix()).expect(404);
  });

  it.each([
    ['kind', { kind: 'glue' }],
    ['operations', { operations: [] }],
    [
      'operations',
      {
        operations: [
          { no: 20, text: 'Drive it.' },
          { no: 10, text: 'Drill it.' },
        ],
      },
    ],
    ['operations.0.text', { operations: [{ no: 10, text: '' }] }],
    ['conditions.0', { conditions: ['x'] }],
  ])('names %s where it cannot be', async (path, facts) => {
    const { id } = await test.create.question(bench);
    const { body } = await test
      .as(bench.mentors[0])
      .post(`/questions/${id}/fixes`)
      .send({ ...aFix(), ...facts })
      .expect(400);
    expect(body.errors.map((fault: { path: string }) => fault.path)).toContain(path);
  });

  it('freezes the check of its remedy beside it, from the question’s own card', async () => {
    const question = await test.create.question(bench);
    const fix = await test.create.fix(bench.mentors[0], question);
    const remedy = fitCheck(aHoleCard()).remedies.find(({ kind }) => kind === 'nextSize');
    expect(fix).toMatchObject({ number: 1, kind: 'nextSize', check: remedy, holeCard: null });
    const { body } = await test.as(bench.builder).get(`/questions/${question.id}`).expect(200);
    const sheet = body as Question;
    expect(sheet.state).toBe('advised');
    expect(sheet.fixes).toEqual([fix]);
  });

  it('checks its own numbers where it brings them, under the kit maker’s limits', async () => {
    const limits = KIT_LIMITS;
    const line = await test.create.holeLine(bench.section, { limits });
    const question = await test.create.question(bench, { holeLineId: line.id });
    const fix = await test.create.fix(bench.mentors[0], question, { holeCard: aHoleCardNearAnEdge() });
    expect(fix.holeCard).toMatchObject({ limits });
    expect(fix.check).toEqual(
      fitCheck({ ...aHoleCardNearAnEdge(), limits }).remedies.find(({ kind }) => kind === 'nextSize'),
    );
  });

  it('has no numbers where the remedy is none of the check', async () => {
    const fix = await test.create.fix(bench.mentors[0], await test.create.question(bench), { kind: 'defer' });
    expect(fix.check).toBeNull();
  });

  it('is over when the question is withdrawn', async () => {
    const { id } = await test.create.question(bench);
    await test
      .as(bench.builder)
      .post(`/questions/${id}/withdrawal`)
      .send({ reason: 'Wrong hole' })
      .expect(200);
    await test.as(bench.mentors[0]).post(`/questions/${id}/fixes`).send(aFix()).expect(409);
  });

  it('is found by its words within the chapter', async () => {
    const own = await test.create.bench();
    const question = await test.create.question(own);
    await test.create.fix(own.mentors[0], question, { summary: 'Bush the hole with a sleeve' });
    const { body } = await test.as(own.builder).get('/questions?q=sleeve').expect(200);
    expect(body.items.map(({ id }: { id: string }) => id)).toEqual([question.id]);
    const other = await test.as(bench.builder).get('/questions?q=sleeve').expect(200);
    expect(other.body.items).toEqual([]);
  });
});

describe('withdrawing a fix', () => {
  it('is its proposer’s, and leaves it readable with the reason', async () => {
    const question = await test.create.question(bench);
    const fix = await test.create.fix(bench.mentors[0], question);
    await test
      .as(bench.mentors[1])
      .post(`/fixes/${fix.id}/withdrawal`)
      .send({ reason: 'Not mine' })
      .expect(403);
    await test
      .as(bench.mentors[0])
      .post(`/fixes/${fix.id}/withdrawal`)
      .send({ reason: 'Wrong drill named' })
      .expect(200);
    await test.as(bench.mentors[0]).post(`/fixes/${fix.id}/withdrawal`).send({ reason: 'Again' }).expect(409);
    await test.as(bench.mentors[1]).post(`/fixes/${fix.id}/endorsements`).send({}).expect(409);
    const { body } = await test.as(bench.builder).get(`/questions/${question.id}`).expect(200);
    expect(body).toMatchObject({ state: 'open', fixes: [{ withdrawn: { reason: 'Wrong drill named' } }] });
  });
});

describe('the fit check', () => {
  it('is for everybody and keeps nothing', async () => {
    const { body } = await test.guest.post('/fit-checks').send({ holeCard: aHoleCard() }).expect(200);
    expect(body as FitCheck).toEqual(fitCheck(aHoleCard()));
  });

  it('names the path of a value that cannot be', async () => {
    const card = aHoleCard();
    const [spar] = card.layers;
    const bad = { ...card, layers: [{ ...spar!, edges: [{ distance: 0.03, angle: 90 }] }] };
    const { body } = await test.guest.post('/fit-checks').send({ holeCard: bad }).expect(400);
    expect(body.errors[0].path).toBe('holeCard.layers.0.edges.0.distance');
  });
});

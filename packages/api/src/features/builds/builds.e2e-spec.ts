import { UnitOfWork } from '../../common/database/unit-of-work.js';
import { newId } from '../../common/ids.js';
import type { Bench } from '../../testing/create-question.js';
import { startTestApp, type TestApp } from '../../testing/start-test-app.js';
import { BuildsService } from './builds.service.js';

let test: TestApp;
let bench: Bench;
beforeAll(async () => {
  test = await startTestApp();
  bench = await test.create.bench();
});
afterAll(() => test.stop());

const raise = (on: Bench, text: string) => {
  const item = {
    buildId: on.build.id,
    sectionId: on.section.id,
    questionId: null,
    text,
    due: 'before the section is closed',
  };
  return test.app.get(UnitOfWork).run((tx) => test.app.get(BuildsService).raiseOpenItem(tx, item));
};

describe('a build', () => {
  it('is seen by owner, crew, its mentor and the chapter’s admin; to others it is not there', async () => {
    const helper = await test.create.user({ chapter: bench.chapter, roles: ['builder'] });
    await test.create.crew(bench.build, helper);
    const admin = await test.create.user({ chapter: bench.chapter, roles: ['chapterAdmin'] });
    const siteAdmin = await test.create.user({ siteRole: 'siteAdmin' });
    const otherAdmin = await test.create.user({ roles: ['chapterAdmin'] });
    for (const user of [bench.builder, helper, admin])
      await test.as(user).get(`/builds/${bench.build.id}`).expect(200);
    for (const user of [bench.mentors[0], siteAdmin, otherAdmin])
      for (const address of ['', '/entries', '/open-items', `/sections/${bench.section.id}/progress`])
        await test.as(user).get(`/builds/${bench.build.id}${address}`).expect(404);
  });

  it('is listed to owner and crew', async () => {
    const { body } = await test.as(bench.builder).get('/builds').expect(200);
    expect(body.items).toEqual([
      expect.objectContaining({ id: bench.build.id, serial: bench.build.serial, mine: true }),
    ]);
    expect((await test.as(bench.mentors[0]).get('/builds').expect(200)).body.items).toEqual([]);
  });
});

describe('progress', () => {
  it('is marked by the builder, step by step, and shows on the kit', async () => {
    const own = await test.create.bench();
    const steps = [await test.create.step(own.section), await test.create.step(own.section)];
    const address = `/builds/${own.build.id}/sections/${own.section.id}/progress`;
    const marked = { steps: [{ stepId: steps[0]!.id, state: 'driven' }] };
    const admin = await test.create.user({ chapter: own.chapter, roles: ['chapterAdmin'] });
    await test.as(admin).put(address).send(marked).expect(403);
    await test.as(own.mentors[0]).put(address).send(marked).expect(404);
    const { body } = await test.as(own.builder).put(address).send(marked).expect(200);
    expect(body.steps).toEqual([
      { stepId: steps[0]!.id, state: 'driven' },
      { stepId: steps[1]!.id, state: 'todo' },
    ]);
    const section = await test.as(own.builder).get(`/sections/${own.section.id}`).expect(200);
    expect(section.body.progress).toEqual(['driven', 'todo']);
  });

  it('knows the steps of its section only', async () => {
    const address = `/builds/${bench.build.id}/sections/${bench.section.id}/progress`;
    const { body } = await test
      .as(bench.builder)
      .put(address)
      .send({ steps: [{ stepId: newId(), state: 'todo' }] })
      .expect(400);
    expect(body.errors[0].path).toBe('steps.0.stepId');
  });
});

describe('an open item', () => {
  it('is cleared by the builder, with a word, once', async () => {
    const id = await raise(bench, 'Measure the driven head');
    const address = `/open-items/${id}/clearance`;
    await test.as(bench.mentors[0]).post(address).send({ note: 'Done' }).expect(404);
    await test.as(bench.builder).post(address).send({ note: '' }).expect(400);
    const { body } = await test
      .as(bench.builder)
      .post(address)
      .send({ note: 'Measured: 0.236 × 0.080' })
      .expect(201);
    expect(body).toMatchObject({ id, clearedNote: 'Measured: 0.236 × 0.080' });
    await test.as(bench.builder).post(address).send({ note: 'Again' }).expect(409);
  });

  it('is cleared by one of two who try at once', async () => {
    const id = await raise(bench, 'Prime the edge');
    const clear = () => test.as(bench.builder).post(`/open-items/${id}/clearance`).send({ note: 'Done it' });
    expect((await Promise.all([clear(), clear()])).map(({ status }) => status).sort()).toEqual([201, 409]);
  });
});

describe('the record', () => {
  it('is never changed and never shortened, not even by the app', async () => {
    const own = await test.create.bench();
    const fix = await test.create.fix(own.mentors[0], await test.create.question(own));
    await test.create.stamp(own.mentors[1], fix);
    await test
      .as(own.builder)
      .post(`/questions/${fix.questionId}/completion`)
      .send({ fixId: fix.id, asDone: {}, minutes: 5 })
      .expect(201);
    const attempt = (sql: string) => test.app.get(UnitOfWork).run((tx) => tx.manager.query(sql));
    await expect(attempt('UPDATE "entries" SET "title" = \'other\'')).rejects.toThrow('never changed');
    await expect(attempt('DELETE FROM "entries"')).rejects.toThrow('never removed');
    const { body } = await test.as(own.builder).get(`/builds/${own.build.id}/entries`).expect(200);
    expect(body.items).toHaveLength(1);
  });
});

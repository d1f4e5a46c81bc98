import { newId } from '../../common/ids.js';
import type { Bench } from '../../testing/create-question.js';
import { startTestApp, type TestApp } from '../../testing/start-test-app.js';

let test: TestApp;
let bench: Bench;
beforeAll(async () => {
  test = await startTestApp();
  bench = await test.create.bench();
});
afterAll(() => test.stop());

describe('the kit', () => {
  it('is shown to nobody who is not signed in, and unknown ones are not found', async () => {
    await test.guest.get('/kits').expect(401);
    for (const address of ['/kits/ID', '/kits/ID/sections', '/sections/ID', '/hole-lines/ID', '/notices/ID'])
      await test.as(bench.builder).get(address.replace('ID', newId())).expect(404);
    await test.as(bench.builder).get('/kits/not-an-id').expect(404);
  });

  it('lists its sections in order, each saying whether it is critical', async () => {
    const kit = await test.create.kit([bench.chapter]);
    await test.create.section(kit, { position: 2, name: 'Second' });
    await test.create.section(kit, { position: 1, name: 'First', critical: true });
    const { body } = await test.as(bench.builder).get(`/kits/${kit.id}/sections`).expect(200);
    expect(
      body.items.map(({ name, critical }: { name: string; critical: boolean }) => [name, critical]),
    ).toEqual([
      ['First', true],
      ['Second', false],
    ]);
  });

  it('counts in a section only the questions that the reader may see', async () => {
    const own = await test.create.bench();
    await test.create.question(own);
    const other = await test.create.chapter();
    await test.create.link(own.kit, other);
    const neighbour = await test.create.user({ chapter: other, roles: ['builder'] });
    const tally = async (user: typeof neighbour) => {
      const { body } = await test.as(user).get(`/sections/${own.section.id}`).expect(200);
      return body.questions;
    };
    expect(await tally(own.builder)).toEqual({ waiting: 1, underReview: 0, total: 1 });
    expect(await tally(neighbour)).toEqual({ waiting: 0, underReview: 0, total: 0 });
  });

  it('shows of a section its steps, parts and hole lines with their stack', async () => {
    const spar = await test.create.part(bench.section, { name: 'Spar' });
    const step = await test.create.step(bench.section, { title: 'Match the spar' });
    const line = await test.create.holeLine(bench.section, { stack: [spar.id], stepId: step.id });
    const { body } = await test.as(bench.builder).get(`/sections/${bench.section.id}`).expect(200);
    expect(body.steps[0]).toMatchObject({ title: 'Match the spar' });
    expect(body.parts.map(({ id }: { id: string }) => id)).toContain(spar.id);
    expect(body.holeLines[0]).toMatchObject({
      id: line.id,
      callOut: '470 AD4-4.5',
      stack: [{ partId: spar.id, name: 'Spar' }],
    });
    const single = await test.as(bench.builder).get(`/hole-lines/${line.id}`).expect(200);
    expect(single.body).toEqual(body.holeLines[0]);
  });

  it('shows what others met in a section once a fix was endorsed or carried out', async () => {
    const own = await test.create.bench();
    const question = await test.create.question(own);
    const metHere = async () => {
      const { body } = await test.as(own.builder).get(`/sections/${own.section.id}`).expect(200);
      return body.metHere.map(({ questionId }: { questionId: string }) => questionId);
    };
    const fix = await test.create.fix(own.mentors[0], question);
    expect(await metHere()).toEqual([]);
    await test.create.stamp(own.mentors[1], fix);
    expect(await metHere()).toEqual([question.id]);
  });

  it('finds parts by number or name, and signs of SQL are only signs', async () => {
    const kit = await test.create.kit([bench.chapter]);
    const section = await test.create.section(kit);
    const part = await test.create.part(section, { number: 'STB/pt-01', name: 'Tip 100% rib' });
    const find = async (q: string) => {
      const { body } = await test.as(bench.builder).get('/parts').query({ kitId: kit.id, q }).expect(200);
      return body.items.map(({ id }: { id: string }) => id);
    };
    expect(await find('stb/')).toEqual([part.id]);
    expect(await find('100%')).toEqual([part.id]);
    expect(await find('_____')).toEqual([]);
    await test.as(bench.builder).get('/parts').query({ kitId: kit.id }).expect(400);
  });
});

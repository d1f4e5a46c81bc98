import type { Question } from '@rivetside/shared';
import { UnitOfWork } from '../../common/database/unit-of-work.js';
import { newId } from '../../common/ids.js';
import { aHoleCardNearAnEdge, type Bench } from '../../testing/create-question.js';
import { startTestApp, type TestApp } from '../../testing/start-test-app.js';
import { EndorsementEntity } from './endorsement.entity.js';
import { StampExpiryJob } from './stamp-expiry.job.js';

let test: TestApp;
let bench: Bench;
beforeAll(async () => {
  test = await startTestApp();
  bench = await test.create.bench();
});
afterAll(() => test.stop());

const sheetOf = async (on: Bench, { id }: { id: string }): Promise<Question> => {
  const { body } = await test.as(on.builder).get(`/questions/${id}`).expect(200);
  return body as Question;
};
const holding = (id: string) =>
  test.app
    .get(UnitOfWork)
    .run((tx) =>
      tx.manager.update(EndorsementEntity, { id }, { heldAt: test.clock.instant(), heldReason: 'Notice 3' }),
    );

describe('a stamp', () => {
  it('is given by nobody but a mentor of the discipline, never under one’s own fix or for one’s own aircraft', async () => {
    const [proposer, other] = bench.mentors;
    const question = await test.create.question(bench);
    const fix = await test.create.fix(proposer, question);
    const address = `/fixes/${fix.id}/endorsements`;
    await test.guest.post(address).send({}).expect(401);
    await test.as(bench.builder).post(address).send({}).expect(403);
    const own = await test.as(proposer).post(address).send({}).expect(403);
    expect(own.body.detail).toBe('Nobody stamps their own fix.');
    const electrician = await test.create.user({
      chapter: bench.chapter,
      roles: ['mentor'],
      disciplines: ['electrical'],
    });
    await test.as(electrician).post(address).send({}).expect(403);
    const stranger = (await test.create.bench()).mentors[0];
    await test.as(stranger).post(address).send({}).expect(404);
    const both = await test.create.user({
      chapter: bench.chapter,
      roles: ['builder', 'mentor'],
      disciplines: ['riveting'],
    });
    const build = await test.create.build({ kit: bench.kit, owner: both, chapter: bench.chapter });
    const ownAircraft = await test.create.question({ ...bench, builder: both, build });
    const advised = await test.create.fix(other, ownAircraft);
    await test.as(both).post(`/fixes/${advised.id}/endorsements`).send({}).expect(403);
  });

  it('stands as given: number, discipline, basis, scope, conditions and how long, and the question is endorsed', async () => {
    const line = await test.create.holeLine(bench.section);
    const question = await test.create.question(bench);
    const fix = await test.create.fix(bench.mentors[0], question);
    const stamp = await test.create.stamp(bench.mentors[1], fix, {
      basis: 'drawingNote',
      reference: 'Drawing 14 note 3',
      scope: { serials: [{ from: 100, to: 140 }], holeLineIds: [line.id], holes: [7] },
      conditions: ['Prime before the next rivet'],
    });
    expect(stamp).toMatchObject({
      stampNumber: 'M-02',
      discipline: 'riveting',
      basis: 'drawingNote',
      state: 'live',
    });
    const sheet = await sheetOf(bench, question);
    expect(sheet.state).toBe('endorsed');
    expect(sheet.waits.for).toBe('builder');
    expect(sheet.fixes[0]!.endorsements).toEqual([stamp]);
    expect(sheet.events.at(-1)).toMatchObject({
      type: 'endorsement',
      data: { endorsement: stamp, standing: { state: 'endorsed' } },
    });
  });

  it('lives 12 months on experience and 24 on anything better, and no longer for being asked', async () => {
    test.clock.set('2026-12-01T10:00:00.000Z');
    const give = async (facts: object) => {
      const fix = await test.create.fix(bench.mentors[0], await test.create.question(bench));
      return test.as(bench.mentors[1]).post(`/fixes/${fix.id}/endorsements`).send(facts);
    };
    expect((await give({})).body).toMatchObject({ basis: 'experience', goodUntil: '2027-12-01' });
    expect((await give({ basis: 'handbook' })).body.goodUntil).toBe('2028-12-01');
    for (const [goodUntil, message] of [
      ['2027-12-02', 'On this basis a stamp stands until 2027-12-01 at most.'],
      ['2026-11-30', 'This day is past.'],
    ]) {
      const { status, body } = await give({ goodUntil });
      expect(status).toBe(400);
      expect(body.errors).toEqual([{ path: 'goodUntil', message }]);
    }
  });

  it('speaks for no hole line of another kit', async () => {
    const other = await test.create.bench();
    const line = await test.create.holeLine(other.section);
    const fix = await test.create.fix(bench.mentors[0], await test.create.question(bench));
    const asked = { scope: { holeLineIds: [line.id] } };
    const { body } = await test
      .as(bench.mentors[1])
      .post(`/fixes/${fix.id}/endorsements`)
      .send(asked)
      .expect(400);
    expect(body.errors[0].path).toBe('scope.holeLineIds.0');
  });

  it('needs a reason under a check with an outside line, and shows it from then on', async () => {
    const question = await test.create.question(bench, { holeCard: aHoleCardNearAnEdge() });
    const fix = await test.create.fix(bench.mentors[0], question);
    expect(fix.check!.checks.map(({ verdict }) => verdict)).toContain('outside');
    const address = `/fixes/${fix.id}/endorsements`;
    const { body } = await test.as(bench.mentors[1]).post(address).send({ basis: 'handbook' }).expect(400);
    expect(body.errors.map(({ path }: { path: string }) => path)).toEqual(['reason']);
    const reason = 'Not loaded there: the drawing shows a locating rivet.';
    const stamp = await test.create.stamp(bench.mentors[1], fix, { basis: 'handbook', reason });
    expect((await sheetOf(bench, question)).fixes[0]!.endorsements[0]!.reason).toBe(stamp.reason);
  });

  it('is not given twice by one mentor, however many ask at once', async () => {
    const fix = await test.create.fix(bench.mentors[0], await test.create.question(bench));
    const tries = Array.from({ length: 50 }, () =>
      test.as(bench.mentors[1]).post(`/fixes/${fix.id}/endorsements`).send({}),
    );
    const statuses = (await Promise.all(tries)).map(({ status }) => status);
    expect(statuses.filter((status) => status === 201)).toHaveLength(1);
    expect(statuses.filter((status) => status === 409)).toHaveLength(49);
  });
});

describe('a critical section', () => {
  it('takes no stamp on experience and needs two mentors', async () => {
    const critical = await test.create.bench({ critical: true });
    const question = await test.create.question(critical);
    const fix = await test.create.fix(critical.mentors[0], question);
    const address = `/fixes/${fix.id}/endorsements`;
    const { body } = await test.as(critical.mentors[1]).post(address).send({}).expect(400);
    expect(body.errors.map(({ path }: { path: string }) => path)).toEqual(['basis']);
    await test.create.stamp(critical.mentors[1], fix, { basis: 'drawingNote' });
    expect(await sheetOf(critical, question)).toMatchObject({
      state: 'advised',
      waits: { for: 'secondStamp' },
    });
    await test.create.stamp(critical.mentors[2], fix, { basis: 'kitMakerReply' });
    expect((await sheetOf(critical, question)).state).toBe('endorsed');
  });
});

describe('an objection', () => {
  it('blocks stamps until it is answered, and puts what was stamped under review', async () => {
    const [proposer, stamper, objector] = bench.mentors;
    const question = await test.create.question(bench);
    const fix = await test.create.fix(proposer, question);
    await test.create.stamp(stamper, fix);
    const address = `/fixes/${fix.id}/objections`;
    await test.as(bench.builder).post(address).send({ reason: 'Too thin' }).expect(403);
    await test.as(proposer).post(address).send({ reason: 'Too thin' }).expect(403);
    await test.as(objector).post(address).send({ reason: '' }).expect(400);
    const { body: objection } = await test
      .as(objector)
      .post(address)
      .send({ reason: 'The spar web is thinner there.' })
      .expect(201);
    await test.as(objector).post(address).send({ reason: 'Once more' }).expect(409);
    expect((await sheetOf(bench, question)).state).toBe('underReview');
    const blocked = await test.as(objector).post(`/fixes/${fix.id}/endorsements`).send({}).expect(409);
    expect(blocked.body.current).toEqual({ state: 'underReview' });

    await test
      .as(bench.builder)
      .post(`/objections/${objection.id}/answer`)
      .send({ answer: 'It is not.' })
      .expect(403);
    await test
      .as(proposer)
      .post(`/objections/${objection.id}/answer`)
      .send({ answer: 'Measured: 0.040 all along.' })
      .expect(200);
    await test.as(proposer).post(`/objections/${objection.id}/answer`).send({ answer: 'Again' }).expect(409);
    const sheet = await sheetOf(bench, question);
    expect(sheet.state).toBe('endorsed');
    expect(sheet.fixes[0]!.objections[0]).toMatchObject({
      reason: 'The spar web is thinner there.',
      answered: { answer: 'Measured: 0.040 all along.' },
    });
  });
});

describe('withdrawing a stamp', () => {
  it('is for its giver or the steward, with a reason, once; the question falls back to what remains', async () => {
    const question = await test.create.question(bench);
    const fix = await test.create.fix(bench.mentors[0], question);
    const first = await test.create.stamp(bench.mentors[1], fix);
    const second = await test.create.stamp(bench.mentors[2], fix);
    const address = `/endorsements/${first.id}/withdrawal`;
    await test.as(bench.mentors[0]).post(address).send({ reason: 'No' }).expect(400);
    await test.as(bench.mentors[0]).post(address).send({ reason: 'Not mine' }).expect(403);
    const { body } = await test
      .as(bench.mentors[1])
      .post(address)
      .send({ reason: 'The drawing changed' })
      .expect(200);
    expect(body).toMatchObject({ state: 'withdrawn', withdrawn: { reason: 'The drawing changed' } });
    await test.as(bench.mentors[1]).post(address).send({ reason: 'Again' }).expect(409);
    expect((await sheetOf(bench, question)).state).toBe('endorsed');
    const steward = await test.create.user({ siteRole: 'steward' });
    await test
      .as(steward)
      .post(`/endorsements/${second.id}/withdrawal`)
      .send({ reason: 'Mentor not to be had' })
      .expect(200);
    expect((await sheetOf(bench, question)).state).toBe('advised');
  });

  it('leaves what was carried out and gives its builder an open item', async () => {
    const own = await test.create.bench();
    const question = await test.create.question(own);
    const fix = await test.create.fix(own.mentors[0], question);
    const stamp = await test.create.stamp(own.mentors[1], fix);
    const done = { fixId: fix.id, asDone: {}, minutes: 30, conditionsMet: ['Measure the driven head'] };
    await test.as(own.builder).post(`/questions/${question.id}/completion`).send(done).expect(201);
    await test
      .as(own.mentors[1])
      .post(`/endorsements/${stamp.id}/withdrawal`)
      .send({ reason: 'The drawing changed' })
      .expect(200);
    expect((await sheetOf(own, question)).state).toBe('carriedOut');
    const { body } = await test.as(own.builder).get(`/builds/${own.build.id}/open-items`).expect(200);
    expect(body.items.map(({ text }: { text: string }) => text)).toEqual([
      `${question.number}: look at it again, stamp M-02 was withdrawn: The drawing changed`,
    ]);
  });
});

describe('a held stamp', () => {
  const heldOn = async () => {
    const question = await test.create.question(bench);
    const fix = await test.create.fix(bench.mentors[0], question);
    const stamp = await test.create.stamp(bench.mentors[1], fix);
    await holding(stamp.id);
    return { question, stamp };
  };
  const review = (id: string, decision: string) =>
    test
      .as(bench.mentors[1])
      .post(`/endorsements/${id}/review`)
      .send({ decision, reason: 'Looked at the new drawing' });

  it('is looked at again by its giver only', async () => {
    const { stamp } = await heldOn();
    const body = { decision: 'keep', reason: 'Looks right to me' };
    await test.as(bench.mentors[2]).post(`/endorsements/${stamp.id}/review`).send(body).expect(403);
    await test.as(bench.builder).post(`/endorsements/${stamp.id}/review`).send(body).expect(403);
  });

  it('counts again when it is kept, and the look stays beside it', async () => {
    const { question, stamp } = await heldOn();
    const { body } = await review(stamp.id, 'keep').expect(200);
    expect(body).toMatchObject({ state: 'live', held: null, reviews: [{ decision: 'keep' }] });
    expect((await sheetOf(bench, question)).state).toBe('endorsed');
    await review(stamp.id, 'keep').expect(409);
  });

  it.each(['change', 'withdraw'])('is gone when the decision is to %s', async (decision) => {
    const { question, stamp } = await heldOn();
    const { body } = await review(stamp.id, decision).expect(200);
    expect(body).toMatchObject({ state: 'withdrawn', reviews: [{ decision }] });
    expect((await sheetOf(bench, question)).state).toBe('advised');
  });
});

describe('a stamp that runs out', () => {
  it('stops counting after its day, tells its sheet once and leaves the builder an open item', async () => {
    const own = await test.create.bench();
    test.clock.set('2026-12-01T10:00:00.000Z');
    const question = await test.create.question(own);
    const done = await test.create.question(own);
    const fix = await test.create.fix(own.mentors[0], question);
    const doneFix = await test.create.fix(own.mentors[0], done);
    await test.create.stamp(own.mentors[1], fix, { goodUntil: '2026-12-20' });
    await test.create.stamp(own.mentors[1], doneFix, { goodUntil: '2026-12-20' });
    await test
      .as(own.builder)
      .post(`/questions/${done.id}/completion`)
      .send({ fixId: doneFix.id, asDone: {}, minutes: 5 })
      .expect(201);
    const job = test.app.get(StampExpiryJob);
    test.clock.set('2026-12-20T23:00:00.000Z');
    await job.expire();
    expect((await sheetOf(own, question)).state).toBe('endorsed');
    test.clock.set('2026-12-21T00:10:00.000Z');
    await Promise.all([job.expire(), job.expire()]);
    const sheet = await sheetOf(own, question);
    expect(sheet.state).toBe('advised');
    expect(sheet.events.filter(({ type }) => type === 'endorsementExpired')).toHaveLength(1);
    expect((await sheetOf(own, done)).state).toBe('carriedOut');
    const { body } = await test.as(own.builder).get(`/builds/${own.build.id}/open-items`).expect(200);
    expect(body.items.map(({ text }: { text: string }) => text)).toContain(
      `${done.number}: look at it again, stamp M-02 ran out on 2026-12-20`,
    );
    test.clock.set(new Date().toISOString());
  });
});

describe('what is not there', () => {
  it.each([
    '/fixes/ID/endorsements',
    '/fixes/ID/objections',
    '/endorsements/ID/withdrawal',
    '/endorsements/ID/review',
    '/objections/ID/answer',
  ])('is not found at %s', async (address) => {
    const body = { reason: 'Because', decision: 'keep', answer: 'Because' };
    const wanted: Record<string, object> = {
      endorsements: {},
      objections: { reason: body.reason },
      withdrawal: { reason: body.reason },
      review: { decision: 'keep', reason: body.reason },
      answer: { answer: body.answer },
    };
    const sent = wanted[address.split('/').at(-1)!]!;
    await test.as(bench.mentors[0]).post(address.replace('ID', newId())).send(sent).expect(404);
  });
});

describe('the audit trail', () => {
  it('holds every stamp, objection, look and withdrawal', async () => {
    const rows = (await test.app
      .get(UnitOfWork)
      .run((tx) => tx.manager.query('SELECT DISTINCT "what" FROM "audit_trail"'))) as { what: string }[];
    expect(rows.map(({ what }) => what)).toEqual(
      expect.arrayContaining([
        'stamp.given',
        'stamp.withdrawn',
        'stamp.reviewed',
        'stamp.expired',
        'objection.raised',
        'objection.answered',
      ]),
    );
  });
});

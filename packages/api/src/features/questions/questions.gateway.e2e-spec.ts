import type { Question } from '@rivetside/shared';
import { UnitOfWork } from '../../common/database/unit-of-work.js';
import type { TestUser } from '../../testing/create-account.js';
import type { Bench } from '../../testing/create-question.js';
import { LiveClient } from '../../testing/live-client.js';
import { startTestApp, type TestApp } from '../../testing/start-test-app.js';
import { MembershipEntity } from '../chapters/membership.entity.js';

let test: TestApp;
let bench: Bench;
let question: Question;
const open: LiveClient[] = [];
beforeAll(async () => {
  test = await startTestApp();
  bench = await test.create.bench();
});
beforeEach(async () => {
  question = await test.create.question(bench);
});
afterEach(() => {
  for (const client of open.splice(0)) client.close();
});
afterAll(() => test.stop());

const live = (user: TestUser) => {
  const client = new LiveClient(test.server, test.tokenOf(user));
  open.push(client);
  return client;
};
const say = (user: TestUser, body: string) =>
  test.as(user).post(`/questions/${question.id}/messages`).send({ body }).expect(201);

describe('the door of a sheet', () => {
  it('opens to nobody without a live session', async () => {
    const client = new LiveClient(test.server, 'no token');
    open.push(client);
    const refused = new Promise((resolve) =>
      client.socket.on('connect_error', ({ message }) => resolve(message)),
    );
    expect(await refused).toBe('unauthorized');
  });

  it('tells a stranger no more than that there is nothing, and sends them nothing', async () => {
    const stranger = live((await test.create.bench()).builder);
    expect(await stranger.join(question.id)).toMatchObject({ ok: false, status: 404 });
    const member = live(bench.builder);
    await member.join(question.id, 1);
    await say(bench.mentors[0], 'Which drill?');
    await member.until(() => member.heard.length === 1, 'the message');
    expect(stranger.heard).toEqual([]);
    expect(stranger.changes).toEqual([]);
  });

  it.each([[null], [{}], [{ questionId: 'x', afterSeq: 0 }], [{ questionId: 7 }]])(
    'refuses %j',
    async (said) => {
      const client = live(bench.builder);
      await client.connected();
      const answer = await client.socket.timeout(5_000).emitWithAck('sheet:join', said as never);
      expect(answer).toMatchObject({ ok: false, status: 400 });
    },
  );

  it('closes when the membership ends', async () => {
    const leaver = await test.create.user({ chapter: bench.chapter, roles: ['builder'] });
    const client = live(leaver);
    await client.join(question.id);
    await test.app
      .get(UnitOfWork)
      .run((tx) => tx.manager.update(MembershipEntity, { userId: leaver.id }, { status: 'suspended' }));
    await client.until(() => !client.socket.connected, 'the end of the connection');
    const again = live(leaver);
    expect(await again.join(question.id)).toMatchObject({ ok: false, status: 404 });
  });
});

describe('an open sheet', () => {
  it('hears every event whole, numbered, after it was committed', async () => {
    const builder = live(bench.builder);
    await builder.join(question.id, 1);
    await say(bench.mentors[0], 'Which drill?');
    const fix = await test.create.fix(bench.mentors[0], question);
    await test.create.stamp(bench.mentors[1], fix);
    await builder.until(() => builder.heard.length === 3, 'three events');
    expect(builder.heard.map(({ seq, type }) => [seq, type])).toEqual([
      [2, 'message'],
      [3, 'fix'],
      [4, 'endorsement'],
    ]);
    expect(builder.heard[0]!.data).toMatchObject({ body: 'Which drill?', photos: [] });
    expect(builder.heard[2]!.data).toMatchObject({ standing: { state: 'endorsed' } });
    const { body } = await test.as(bench.builder).get(`/questions/${question.id}/events?after=1`).expect(200);
    expect(builder.heard).toEqual(body.items);
  });

  it('catches up by number after a break: nothing is missed and nothing comes twice', async () => {
    const first = live(bench.builder);
    await first.join(question.id, 1);
    await say(bench.mentors[0], 'one');
    await first.until(() => first.heard.length === 1, 'the first line');
    first.close();
    await say(bench.mentors[0], 'two');
    await say(bench.mentors[0], 'three');
    const back = live(bench.builder);
    const answer = await back.join(question.id, first.heard.at(-1)!.seq);
    await say(bench.mentors[0], 'four');
    await back.until(() => back.heard.length === 1, 'the newest line');
    const events = answer.ok ? answer.events : [];
    expect([...first.heard, ...events, ...back.heard].map(({ data }) => data['body'])).toEqual([
      'one',
      'two',
      'three',
      'four',
    ]);
  });

  it('says when more was missed than a socket gives', async () => {
    for (let line = 0; line < 501; line += 1) await say(bench.mentors[0], `line ${line}`);
    const answer = await live(bench.builder).join(question.id, 0);
    expect(answer).toMatchObject({ ok: true, whole: false });
    expect(answer.ok && answer.events.map(({ seq }) => seq)).toEqual(
      Array.from({ length: 500 }, (_, at) => at + 1),
    );
  });

  it('shows who is there, each once however many tabs, and who is writing', async () => {
    const builder = live(bench.builder);
    const mentor = live(bench.mentors[0]);
    const secondTab = live(bench.mentors[0]);
    for (const client of [builder, mentor, secondTab]) await client.join(question.id);
    const names = [bench.builder.name, bench.mentors[0].name].sort();
    await builder.until(() => builder.at(question.id).join() === names.join(), 'both names');
    mentor.socket.emit('sheet:writing', { questionId: question.id, writing: true });
    await builder.until(
      () => builder.at(question.id).includes(`${bench.mentors[0].name} writes`),
      'the writing',
    );
    mentor.socket.emit('sheet:writing', { questionId: question.id, writing: false });
    await builder.until(() => builder.at(question.id).join() === names.join(), 'the end of writing');
    mentor.close();
    secondTab.socket.emit('sheet:leave', { questionId: question.id });
    await builder.until(() => builder.at(question.id).join() === bench.builder.name, 'the leaving');
  });

  it('takes no word of writing from who has not come in', async () => {
    const builder = live(bench.builder);
    const outside = live(bench.mentors[0]);
    await builder.join(question.id);
    await outside.connected();
    outside.socket.emit('sheet:writing', { questionId: question.id, writing: true });
    // Answered in order: by now the word before it was heard.
    await outside.join((await test.create.question(bench)).id);
    await builder.until(() => builder.at(question.id).length > 0, 'the presence');
    expect(builder.at(question.id)).toEqual([bench.builder.name]);
  });
});

describe('lists', () => {
  it('hear that a question changed, by its id only', async () => {
    const member = live(bench.mentors[2]);
    await member.connected();
    const asked = await test.create.question(bench);
    await member.until(() => member.changes.includes(asked.id), 'the hint');
    expect(member.heard).toEqual([]);
  });
});

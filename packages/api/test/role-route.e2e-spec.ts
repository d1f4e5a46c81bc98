import type { OpenAPIObject } from '@nestjs/swagger';
import type { Role } from '@rivetside/shared';
import { newId } from '../src/common/ids.js';
import type { TestUser } from '../src/testing/create-account.js';
import { aFix, type Bench } from '../src/testing/create-question.js';
import { startTestApp, type TestApp, type TestClient } from '../src/testing/start-test-app.js';

type Method = 'get' | 'post' | 'put' | 'patch' | 'delete';
interface Route {
  readonly name: string;
  readonly method: Method;
  readonly path: string;
  readonly roles: readonly string[];
}

/** Bodies and queries that can be: so that an answer tells of access and not of a missing field. */
const REASON = { reason: 'Because the drawing changed' };
const BODIES: Readonly<Record<string, object>> = {
  'POST /questions/{id}/messages': { body: 'Which drill?' },
  'POST /questions/{id}/fixes': aFix(),
  'POST /questions/{id}/completion': { fixId: newId(), asDone: {}, minutes: 1 },
  'POST /questions/{id}/referral': {},
  'POST /questions/{id}/referral/answer': { answer: 'Use AD5.', reference: 'R-1' },
  'POST /questions/{id}/withdrawal': REASON,
  'PUT /questions/{id}/seen': { seq: 1 },
  'POST /fixes/{id}/withdrawal': REASON,
  'POST /fixes/{id}/objections': REASON,
  'POST /objections/{id}/answer': { answer: 'Measured again.' },
  'POST /fixes/{id}/endorsements': {},
  'POST /endorsements/{id}/withdrawal': REASON,
  'POST /endorsements/{id}/review': { decision: 'keep', ...REASON },
  'POST /open-items/{id}/clearance': { note: 'Done it' },
  'PUT /builds/{id}/sections/{sectionId}/progress': { steps: [] },
  'PATCH /photos/{id}': { caption: 'Mine' },
};
/** Open to every signed-in person by design: the kit is the same for all. */
const EVERYBODYS = [
  'GET /kits/{kitId}',
  'GET /kits/{kitId}/sections',
  'GET /sections/{id}',
  'GET /hole-lines/{id}',
  'GET /notices/{id}',
  'GET /chapters/{id}',
];

let test: TestApp;
let routes: Route[];
let people: Record<Exclude<Role, 'guest'>, TestUser>;
let theirs: Record<string, string>;

beforeAll(async () => {
  test = await startTestApp();
  const document = (await test.guest.get('/docs-json').expect(200)).body as OpenAPIObject;
  routes = Object.entries(document.paths).flatMap(([path, item]) =>
    Object.entries(item).flatMap(([method, operation]) => {
      const { 'x-roles': roles = [] } = operation as { 'x-roles'?: string[] };
      const below = path.replace(/^\/api/, '');
      return [{ name: `${method.toUpperCase()} ${below}`, method: method as Method, path: below, roles }];
    }),
  );
  const chapter = await test.create.chapter();
  people = {
    builder: await test.create.user({ chapter, roles: ['builder'] }),
    mentor: await test.create.user({ chapter, roles: ['mentor'], disciplines: ['riveting'] }),
    chapterAdmin: await test.create.user({ chapter, roles: ['chapterAdmin'] }),
    steward: await test.create.user({ siteRole: 'steward' }),
    siteAdmin: await test.create.user({ siteRole: 'siteAdmin' }),
  };
  theirs = await somebodyElses(await test.create.bench());
});
afterAll(() => test.stop());

/** One of everything that has an id, in a chapter where none of the people is. */
async function somebodyElses(bench: Bench): Promise<Record<string, string>> {
  const [proposer, stamper, objector] = bench.mentors;
  const question = await test.create.question(bench);
  const fix = await test.create.fix(proposer, question);
  const stamp = await test.create.stamp(stamper, fix);
  const { body: objection } = await test
    .as(objector)
    .post(`/fixes/${fix.id}/objections`)
    .send(REASON)
    .expect(201);
  const done = await test.create.question(bench);
  const carriedOut = await test.create.fix(proposer, done);
  await test.create.stamp(stamper, carriedOut);
  const completion = { fixId: carriedOut.id, asDone: {}, minutes: 1 };
  await test.as(bench.builder).post(`/questions/${done.id}/completion`).send(completion).expect(201);
  const items = await test.as(bench.builder).get(`/builds/${bench.build.id}/open-items`).expect(200);
  return {
    questions: question.id,
    fixes: fix.id,
    endorsements: stamp.id,
    objections: objection.id,
    'open-items': items.body.items[0].id,
    builds: bench.build.id,
    chapters: bench.chapter.id,
    sectionId: bench.section.id,
  };
}

function send(client: TestClient, { name, method, path }: Route) {
  const thing = path.split('/')[1]!;
  const address = path
    .replace('{sectionId}', theirs['sectionId']!)
    .replace(/\{\w+\}/, theirs[thing] ?? newId());
  const request = client[method](address);
  return method === 'get' || method === 'delete' ? request : request.send(BODIES[name] ?? {});
}

const isPublic = ({ roles }: Route) => roles.includes('guest');
const takesAll = ({ roles }: Route) => roles.includes('authenticated');
/** Ends the session that asks. */
const ENDS = ['POST /auth/sign-out'];

describe('every route', () => {
  it('lets nobody in without a session unless it is for guests', async () => {
    const wrong: string[] = [];
    for (const route of routes.filter((one) => !isPublic(one)))
      if ((await send(test.guest, route)).status !== 401) wrong.push(route.name);
    expect(wrong).toEqual([]);
    expect(routes.length).toBeGreaterThan(40);
  });

  it('refuses a signed-in person who holds none of its roles', async () => {
    const wrong: string[] = [];
    const nobody = await test.create.user();
    for (const route of routes.filter((one) => !isPublic(one) && !takesAll(one))) {
      if ((await send(test.as(nobody), route)).status !== 403) wrong.push(`${route.name} as nobody`);
      for (const [role, person] of Object.entries(people)) {
        if (route.roles.includes(role)) continue;
        const { status } = await send(test.as(person), route);
        if (status !== 403) wrong.push(`${route.name} as ${role}: ${status}`);
      }
    }
    expect(wrong).toEqual([]);
  });

  it('never answers a role it names with "not signed in" or, without an id, "not allowed"', async () => {
    const wrong: string[] = [];
    for (const route of routes.filter((one) => !isPublic(one) && !ENDS.includes(one.name)))
      for (const [role, person] of Object.entries(people)) {
        if (!takesAll(route) && !route.roles.includes(role)) continue;
        const { status } = await send(test.as(person), route);
        if (status === 401 || (status === 403 && !route.path.includes('{')))
          wrong.push(`${route.name} as ${role}: ${status}`);
      }
    expect(wrong).toEqual([]);
  });

  it('does not know of somebody else’s object', async () => {
    const wrong: string[] = [];
    const foreign = routes.filter(
      (one) => one.path.includes('{') && !isPublic(one) && !EVERYBODYS.includes(one.name),
    );
    for (const route of foreign)
      for (const role of ['builder', 'mentor', 'chapterAdmin'] as const) {
        if (!takesAll(route) && !route.roles.includes(role)) continue;
        const { status } = await send(test.as(people[role]), route);
        if (status !== 404) wrong.push(`${route.name} as ${role}: ${status}`);
      }
    expect(wrong).toEqual([]);
    expect(foreign.length).toBeGreaterThan(15);
  });
});

import { newId } from '../../common/ids.js';
import type { TestUser } from '../../testing/create-account.js';
import { startTestApp, type TestApp } from '../../testing/start-test-app.js';
import type { ChapterEntity } from './chapter.entity.js';

let test: TestApp;
let here: ChapterEntity;
let there: ChapterEntity;
let builder: TestUser;
beforeAll(async () => {
  test = await startTestApp();
  here = await test.create.chapter({ name: 'Moss Hill', place: 'Hangar 3', meets: 'First Tuesday, 19:00' });
  there = await test.create.chapter({ name: 'Tin Shed' });
  builder = await test.create.user({ name: 'Wenna Trevose', chapter: here, roles: ['builder'] });
});
afterAll(() => test.stop());

describe('the chapters', () => {
  it('are shown to nobody who is not signed in', async () => {
    await test.guest.get('/chapters').expect(401);
    await test.guest.get(`/chapters/${here.id}`).expect(401);
  });

  it('are listed with name, place and meeting day, and which of them are one’s own', async () => {
    const { body } = await test.as(builder).get('/chapters').expect(200);
    expect(body).toEqual({
      items: [
        {
          id: here.id,
          name: 'Moss Hill',
          zone: 'Europe/London',
          currency: 'GBP',
          meets: 'First Tuesday, 19:00',
          place: 'Hangar 3',
          member: true,
        },
        expect.objectContaining({ id: there.id, name: 'Tin Shed', member: false }),
      ],
      nextCursor: null,
    });
  });

  it.each(['requested', 'suspended'] as const)(
    'are not one’s own while the membership is %s',
    async (status) => {
      const other = await test.create.user({ chapter: here, roles: ['builder'], status });
      const { body } = await test.as(other).get(`/chapters/${here.id}`).expect(200);
      expect(body.member).toBe(false);
    },
  );

  it('come in pages that neither miss nor repeat one', async () => {
    const first = await test.as(builder).get('/chapters?limit=1').expect(200);
    expect(first.body.items.map(({ name }: { name: string }) => name)).toEqual(['Moss Hill']);
    const next = await test.as(builder).get(`/chapters?limit=1&cursor=${first.body.nextCursor}`).expect(200);
    expect(next.body.items.map(({ name }: { name: string }) => name)).toEqual(['Tin Shed']);
    expect(next.body.nextCursor).toBeNull();
  });

  it.each(['limit=0', 'limit=101', 'limit=many', 'cursor=nonsense', 'order=name'])(
    'refuse the query %s',
    async (query) => {
      await test.as(builder).get(`/chapters?${query}`).expect(400);
    },
  );

  it.each([
    { what: 'no id', id: 'here' },
    { what: 'an unknown id', id: newId() },
  ])('are not found by $what', async ({ id }) => {
    await test.as(builder).get(`/chapters/${id}`).expect(404);
    await test.as(builder).get(`/chapters/${id}/members`).expect(404);
  });
});

describe('the members of a chapter', () => {
  const members = (who: TestUser, chapter = here) => test.as(who).get(`/chapters/${chapter.id}/members`);

  it('are shown to nobody who is not signed in', async () => {
    await test.guest.get(`/chapters/${here.id}/members`).expect(401);
  });

  it.each<{ who: string; facts: () => Parameters<TestApp['create']['user']>[0]; status: number }>([
    { who: 'somebody without a chapter', facts: () => ({}), status: 403 },
    { who: 'a kit steward without a chapter', facts: () => ({ siteRole: 'steward' }), status: 403 },
    {
      who: 'a builder of another chapter',
      facts: () => ({ chapter: there, roles: ['builder'] }),
      status: 404,
    },
    {
      who: 'the admin of another chapter',
      facts: () => ({ chapter: there, roles: ['chapterAdmin'] }),
      status: 404,
    },
    {
      who: 'a suspended mentor',
      facts: () => ({ chapter: here, roles: ['mentor'], status: 'suspended' }),
      status: 403,
    },
    {
      who: 'whoever has asked to join',
      facts: () => ({ chapter: here, roles: ['builder'], status: 'requested' }),
      status: 403,
    },
    { who: 'a builder', facts: () => ({ chapter: here, roles: ['builder'] }), status: 200 },
    { who: 'a mentor', facts: () => ({ chapter: here, roles: ['mentor'] }), status: 200 },
    { who: 'a chapter admin', facts: () => ({ chapter: here, roles: ['chapterAdmin'] }), status: 200 },
    { who: 'a site admin', facts: () => ({ siteRole: 'siteAdmin' }), status: 200 },
  ])('answer $status to $who', async ({ facts, status }) => {
    await members(await test.create.user(facts())).expect(status);
  });

  it('are listed with name, roles, disciplines and stamp number, and nothing private', async () => {
    const chapter = await test.create.chapter();
    const mentor = await test.create.user({
      name: 'Jory Pascoe',
      chapter,
      roles: ['builder', 'mentor'],
      disciplines: ['riveting', 'sheetMetal'],
      stampNumber: 'M-07',
    });
    const admin = await test.create.user({ name: 'Ada Rowe', chapter, roles: ['chapterAdmin'] });
    await test.create.user({ name: 'Not Yet', chapter, roles: ['builder'], status: 'requested' });
    await test.create.user({ name: 'Put Out', chapter, roles: ['builder'], status: 'suspended' });
    await test.create.user({ name: 'Elsewhere', chapter: there, roles: ['builder'] });
    const { body } = await members(mentor, chapter).expect(200);
    expect(body).toEqual({
      items: [
        { userId: admin.id, name: 'Ada Rowe', roles: ['chapterAdmin'], disciplines: [], stampNumber: null },
        {
          userId: mentor.id,
          name: 'Jory Pascoe',
          roles: ['builder', 'mentor'],
          disciplines: ['riveting', 'sheetMetal'],
          stampNumber: 'M-07',
        },
      ],
      nextCursor: null,
    });
  });

  it('of the same name come in pages that neither miss nor repeat one', async () => {
    const chapter = await test.create.chapter();
    const people: string[] = [];
    for (let n = 0; n < 3; n += 1)
      people.push((await test.create.user({ name: 'Same Name', chapter, roles: ['builder'] })).id);
    const reader = await test.create.user({ siteRole: 'siteAdmin' });
    const seen: string[] = [];
    let cursor: string | null = null;
    do {
      const query: string = cursor === null ? '' : `&cursor=${cursor}`;
      const { body } = await test
        .as(reader)
        .get(`/chapters/${chapter.id}/members?limit=2${query}`)
        .expect(200);
      seen.push(...body.items.map(({ userId }: { userId: string }) => userId));
      cursor = body.nextCursor as string | null;
    } while (cursor !== null);
    expect(seen).toEqual([...people].sort());
  });
});

import { Controller, Get, Module, Post } from '@nestjs/common';
import { Body } from '@nestjs/common';
import type { Actor as ActorType } from '@rivetside/shared';
import { z } from 'zod';
import type { TestUser } from '../../testing/create-account.js';
import { type Claims, forgeToken, readToken } from '../../testing/forge-token.js';
import { startTestApp, type TestApp } from '../../testing/start-test-app.js';
import { UnitOfWork } from '../database/unit-of-work.js';
import { Access, Actor, Public } from './access.decorator.js';

const wordSchema = z.strictObject({ word: z.string() });

@Controller('doors')
class DoorsController {
  @Get('forgotten')
  forgotten(): string {
    return 'in';
  }

  @Get('public')
  @Public()
  everybody(): string {
    return 'in';
  }

  @Get('anyone')
  @Access('authenticated')
  anyone(@Actor() actor: ActorType): ActorType {
    return actor;
  }

  @Get('mentors')
  @Access('mentor', 'siteAdmin')
  mentors(): string {
    return 'in';
  }

  @Post('mentors')
  @Access('mentor')
  say(@Body({ schema: wordSchema }) input: { word: string }): { word: string } {
    return input;
  }
}

@Module({ controllers: [DoorsController] })
class DoorsModule {}

let test: TestApp;
let user: TestUser;
beforeAll(async () => {
  test = await startTestApp({ modules: [DoorsModule] });
});
afterAll(() => test.stop());
beforeEach(async () => {
  user = await test.create.user();
});

describe('the guard', () => {
  it('refuses everybody where no access is declared', async () => {
    const admin = await test.create.user({
      siteRole: 'siteAdmin',
      roles: ['builder', 'mentor', 'chapterAdmin'],
    });
    await test.guest.get('/doors/forgotten').expect(403);
    await test.as(admin).get('/doors/forgotten').expect(403);
  });

  it('lets everybody through a public door', async () => {
    await test.guest.get('/doors/public').expect(200);
    await test.guest.get('/doors/public').set('authorization', 'Bearer nonsense').expect(200);
  });

  it('refuses a guest with 401 in problem form', async () => {
    const { body, headers } = await test.guest.get('/doors/anyone').expect(401);
    expect(headers['content-type']).toMatch(/^application\/problem\+json/);
    expect(body).toEqual({
      type: 'about:blank',
      title: 'Not signed in',
      status: 401,
      detail: 'Sign in first.',
      instance: '/api/doors/anyone',
    });
  });

  it.each<{ who: string; facts: Parameters<TestApp['create']['user']>[0]; status: number }>([
    { who: 'somebody without a chapter', facts: {}, status: 403 },
    { who: 'a builder', facts: { roles: ['builder'] }, status: 403 },
    { who: 'a chapter admin', facts: { roles: ['chapterAdmin'] }, status: 403 },
    { who: 'a kit steward', facts: { siteRole: 'steward' }, status: 403 },
    { who: 'a mentor', facts: { roles: ['mentor'] }, status: 200 },
    { who: 'a builder who is a mentor too', facts: { roles: ['builder', 'mentor'] }, status: 200 },
    { who: 'a site admin', facts: { siteRole: 'siteAdmin' }, status: 200 },
    { who: 'a mentor who is suspended', facts: { roles: ['mentor'], status: 'suspended' }, status: 403 },
    { who: 'a mentor who has asked to join', facts: { roles: ['mentor'], status: 'requested' }, status: 403 },
  ])('answers $status to $who at a door for mentors', async ({ facts, status }) => {
    await test
      .as(await test.create.user(facts))
      .get('/doors/mentors')
      .expect(status);
  });

  it('says whom a door is for', async () => {
    const { body } = await test.as(user).get('/doors/mentors').expect(403);
    expect(body.detail).toBe('This is for mentors, site admins.');
  });

  it('asks for access before it looks at the body', async () => {
    const wrong = { nonsense: true };
    await test.guest.post('/doors/mentors').send(wrong).expect(401);
    await test.as(user).post('/doors/mentors').send(wrong).expect(403);
    const mentor = await test.create.user({ roles: ['mentor'] });
    await test.as(mentor).post('/doors/mentors').send(wrong).expect(400);
    await test.as(mentor).post('/doors/mentors').send({ word: 'in' }).expect(201);
  });

  it('hands on who somebody is, with every membership', async () => {
    const chapter = await test.create.chapter();
    await test.create.member(user, { chapter, roles: ['mentor'], disciplines: ['riveting'] });
    const { body } = await test.as(user).get('/doors/anyone').expect(200);
    expect(body).toEqual({
      id: user.id,
      name: user.name,
      sessionId: user.sessionId,
      siteRole: null,
      memberships: [
        {
          chapterId: chapter.id,
          chapterName: chapter.name,
          roles: ['mentor'],
          disciplines: ['riveting'],
          status: 'active',
        },
      ],
    });
  });
});

describe('at the very next request', () => {
  const run = (sql: string, id: string) =>
    test.app.get(UnitOfWork).runPrepared((db) => void db.run(sql, [id]));

  it.each([
    {
      loss: 'a lost role',
      sql: `UPDATE "memberships" SET "roles" = '["builder"]' WHERE "userId" = ?`,
      status: 403,
    },
    {
      loss: 'a suspension',
      sql: `UPDATE "memberships" SET "status" = 'suspended' WHERE "userId" = ?`,
      status: 403,
    },
    { loss: 'a removal', sql: `DELETE FROM "memberships" WHERE "userId" = ?`, status: 403 },
    {
      loss: 'an ended session',
      sql: `UPDATE "sessions" SET "endedAt" = 'now' WHERE "userId" = ?`,
      status: 401,
    },
    { loss: 'a closed account', sql: `UPDATE "users" SET "disabledAt" = 'now' WHERE "id" = ?`, status: 401 },
    { loss: 'a removed account', sql: `DELETE FROM "users" WHERE "id" = ?`, status: 401 },
  ])('$loss counts', async ({ sql, status }) => {
    const mentor = await test.create.user({ roles: ['mentor'] });
    await test.as(mentor).get('/doors/mentors').expect(200);
    await run(sql, mentor.id);
    await test.as(mentor).get('/doors/mentors').expect(status);
  });

  it('a role that was given counts too', async () => {
    await test.as(user).get('/doors/mentors').expect(403);
    await test.create.member(user, { roles: ['mentor'] });
    await test.as(user).get('/doors/mentors').expect(200);
  });
});

describe('an access token', () => {
  const now = Math.floor(Date.now() / 1_000);
  const claimsOf = (change: Claims = {}): Claims => ({
    sub: user.id,
    sid: user.sessionId,
    typ: 'access',
    iss: 'rivetside',
    aud: 'rivetside-api',
    iat: now,
    exp: now + 900,
    ...change,
  });
  const ask = (token: string) => test.guest.get('/doors/anyone').set('authorization', `Bearer ${token}`);
  const ours = (change?: Claims, header?: Claims) =>
    forgeToken(claimsOf(change), test.settings.jwtSecret, header);

  it('is believed where nothing is wrong with it', async () => {
    await ask(ours()).expect(200);
  });

  it.each<{ fault: string; token: () => string }>([
    { fault: 'nothing of a token', token: () => 'nonsense' },
    { fault: 'no signature', token: () => forgeToken(claimsOf(), null) },
    { fault: 'the algorithm none', token: () => forgeToken(claimsOf(), null, { alg: 'none' }) },
    { fault: 'the algorithm NONE in capitals', token: () => forgeToken(claimsOf(), null, { alg: 'NONE' }) },
    { fault: 'another key', token: () => forgeToken(claimsOf(), 'another key of enough characters') },
    { fault: 'an empty key', token: () => forgeToken(claimsOf(), '') },
    { fault: 'another algorithm with our key', token: () => ours({}, { alg: 'HS512' }) },
    {
      fault: 'a key of its own in the header',
      token: () => forgeToken(claimsOf(), 'own', { jwk: { kty: 'oct', k: 'b3du' } }),
    },
    { fault: 'a key id that is a path', token: () => forgeToken(claimsOf(), '', { kid: '/dev/null' }) },
    { fault: 'an end that is past', token: () => ours({ iat: now - 1_000, exp: now - 100 }) },
    { fault: 'no end', token: () => ours({ exp: undefined }) },
    { fault: 'no beginning', token: () => ours({ iat: undefined }) },
    { fault: 'an end far ahead', token: () => ours({ exp: now + 86_400 }) },
    { fault: 'a beginning still to come', token: () => ours({ nbf: now + 600 }) },
    { fault: 'another issuer', token: () => ours({ iss: 'elsewhere' }) },
    { fault: 'no issuer', token: () => ours({ iss: undefined }) },
    { fault: 'another audience', token: () => ours({ aud: 'elsewhere' }) },
    { fault: 'no audience', token: () => ours({ aud: undefined }) },
    { fault: 'another kind', token: () => ours({ typ: 'refresh' }) },
    { fault: 'no kind', token: () => ours({ typ: undefined }) },
    { fault: 'no session', token: () => ours({ sid: undefined }) },
    { fault: 'an unknown session', token: () => ours({ sid: user.id }) },
    { fault: 'a session that is no text', token: () => ours({ sid: { $ne: null } }) },
    { fault: 'nobody', token: () => ours({ sub: undefined }) },
  ])('is refused with $fault', async ({ token }) => {
    const { body } = await ask(token()).expect(401);
    expect(body.detail).toBe('Sign in first.');
  });

  it('is refused with another’s name on an own session', async () => {
    const other = await test.create.user();
    await ask(ours({ sub: other.id })).expect(401);
  });

  it('is refused when a letter of it was changed', async () => {
    const [header, claims, seal] = test.tokenOf(user).split('.');
    const changed = Buffer.from(JSON.stringify({ ...readToken(test.tokenOf(user)).claims, sub: 'x' }));
    await ask([header, changed.toString('base64url'), seal].join('.')).expect(401);
    await ask([header, claims, seal!.split('').reverse().join('')].join('.')).expect(401);
  });

  it('is taken from the Authorization header alone', async () => {
    const token = test.tokenOf(user);
    await test.guest.get(`/doors/anyone?access_token=${token}`).expect(401);
    await test.guest.get('/doors/anyone').set('cookie', `token=${token}`).expect(401);
    await test.guest.get('/doors/anyone').set('authorization', `Basic ${token}`).expect(401);
    await test.guest.get('/doors/anyone').set('authorization', token).expect(401);
  });
});

import { request as httpRequest } from 'node:http';
import { type AddressInfo, connect } from 'node:net';
import { Body, Controller, Get, Module, Param, Post, Put, Query } from '@nestjs/common';
import { RouteConfig } from '@nestjs/platform-fastify';
import supertest from 'supertest';
import { z } from 'zod';
import { startTestApp, type TestApp } from '../../testing/start-test-app.js';
import { Access, Public } from '../access/access.decorator.js';
import { TooMany } from '../errors/app-error.js';
import { UuidPipe } from './uuid.pipe.js';

const bodySchema = z.strictObject({
  name: z.string().min(2),
  layers: z.array(z.strictObject({ thickness: z.number().positive() })).optional(),
});
const querySchema = z.strictObject({ limit: z.coerce.number().int().optional() });

@Controller('trial')
class TrialController {
  @Post()
  @Public()
  take(@Body({ schema: bodySchema }) body: z.infer<typeof bodySchema>) {
    return body;
  }

  @Post('form')
  @Public()
  @RouteConfig({ takesForms: true })
  form(@Body() body: unknown) {
    return body;
  }

  @Get()
  @Public()
  list(@Query({ schema: querySchema }) query: z.infer<typeof querySchema>) {
    return query;
  }

  @Get('one/:id')
  @Public()
  one(@Param('id', UuidPipe) id: string) {
    return { id };
  }

  @Put('one/:id')
  @Access('authenticated')
  change(@Body({ schema: bodySchema }) body: z.infer<typeof bodySchema>) {
    return body;
  }

  @Get('broken')
  @Public()
  broken() {
    throw new Error('SELECT "passwordHash" FROM "users" at /srv/app/secret.js:12');
  }

  @Get('too-many')
  @Public()
  tooMany() {
    throw new TooMany(17);
  }

  @Get('undeclared')
  undeclared() {
    return 'never';
  }
}

@Module({ controllers: [TrialController] })
class TrialModule {}

describe('over HTTP', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await startTestApp({ modules: [TrialModule] });
  });
  afterAll(() => test.stop());

  const post = (body: string, type = 'application/json') =>
    supertest(test.server).post('/api/trial').set('content-type', type).send(body);
  const expectProblem = (response: supertest.Response, status: number) => {
    expect(response.status).toBe(status);
    expect(response.headers['content-type']).toBe('application/problem+json; charset=utf-8');
    const problem = JSON.parse(response.text) as Record<string, unknown>;
    expect(problem).toMatchObject({ type: 'about:blank', status });
    expect(Object.keys(problem)).toEqual(expect.arrayContaining(['title', 'detail', 'instance']));
    return problem;
  };

  describe('a body', () => {
    it('that fits is taken', async () => {
      await test.guest.post('/trial').send({ name: 'rib' }).expect(201, { name: 'rib' });
    });

    it.each([
      { what: 'cut off', body: '{"name": "ri' },
      { what: 'no JSON', body: 'name=rib' },
      { what: 'empty', body: '' },
      { what: 'a prototype', body: '{"name": "rib", "__proto__": {"admin": true}}' },
      { what: 'a prototype within', body: '{"name": "rib", "layers": [{"__proto__": {"thickness": 1}}]}' },
      { what: 'a constructor', body: '{"name": "rib", "constructor": {"prototype": {"admin": true}}}' },
      { what: '5,000 arrays deep', body: `{"name": ${'['.repeat(5_000)}${']'.repeat(5_000)}}` },
      { what: '5,000 objects deep', body: `${'{"name":'.repeat(5_000)}1${'}'.repeat(5_000)}` },
      { what: 'a list', body: '[]' },
      { what: 'null', body: 'null' },
      { what: 'a number', body: '17' },
      { what: 'not UTF-8', body: Buffer.from([0x7b, 0xff, 0xfe, 0x7d]).toString('latin1') },
    ])('that is $what is a plain 400', async ({ body }) => {
      const response = await post(body);
      expectProblem(response, 400);
      expect(response.text).not.toMatch(/ at |node_modules|Unexpected token|SyntaxError/);
    });

    it('with an unknown field is refused with its name', async () => {
      const problem = expectProblem(await post('{"name": "rib", "isAdmin": true}'), 400);
      expect(problem['errors']).toEqual([{ path: '', message: expect.stringContaining('isAdmin') }]);
    });

    it('names each fault by its dotted path', async () => {
      const problem = expectProblem(
        await post('{"name": "x", "layers": [{"thickness": 1}, {"thickness": -1}]}'),
        400,
      );
      expect((problem['errors'] as { path: string }[]).map(({ path }) => path)).toEqual([
        'name',
        'layers.1.thickness',
      ]);
    });

    it('with many faults tells the first fifty', async () => {
      const layers = Array.from({ length: 5_000 }, () => ({ thickness: 'thick' }));
      const problem = expectProblem(await post(JSON.stringify({ name: 'rib', layers })), 400);
      expect(problem['errors']).toHaveLength(50);
    });

    it('that is too large is a 413', async () => {
      expectProblem(await post(JSON.stringify({ name: 'x'.repeat(600_000) })), 413);
    });

    it.each(['text/plain', 'application/xml', 'application/x-www-form-urlencoded', 'image/svg+xml'])(
      'as %s is a 415',
      async (type) => {
        expectProblem(await post('name=rib', type), 415);
      },
    );

    it('as a form is taken where a route says so', async () => {
      await test.guest.post('/trial/form').type('form').send('List-Unsubscribe=One-Click').expect(201);
    });

    it('is not looked at before the access is', async () => {
      const response = await test.guest.put('/trial/one/x').send({ name: 'x', unknown: 1 });
      expectProblem(response, 401);
    });
  });

  describe('an address', () => {
    it('that is nowhere is a 404', async () => {
      expectProblem(await test.guest.get('/nowhere'), 404);
    });

    it('with another method is a 405 that says which ones it has', async () => {
      const response = await test.guest.delete('/trial/one/018f0000-0000-7000-8000-000000000000');
      expectProblem(response, 405);
      expect(response.headers['allow']).toBe('GET, HEAD, PUT');
    });

    it.each(['OPTIONS', 'TRACE', 'PROPFIND'])('asked by %s is refused as a problem', async (method) => {
      const response = await rawRequest(method, '/api/trial');
      expect([404, 405]).toContain(response.status);
      expect(response.type).toContain('application/problem+json');
    });

    it.each(['17', 'x', "1' OR '1'='1", '..%2f..%2fetc', '%00', 'x'.repeat(190)])(
      'whose id is %s names nothing',
      async (id) => expectProblem(await test.guest.get(`/trial/one/${id}`), 404),
    );

    it('that cannot be decoded is a 400', async () => {
      const response = await rawRequest('GET', '/api/trial/one/%zz');
      expect(response).toMatchObject({
        status: 400,
        type: expect.stringContaining('application/problem+json'),
      });
    });

    it('whose part is longer than any id is refused', async () => {
      const response = await test.guest.get(`/trial/one/${'x'.repeat(1_000)}`);
      expect([404, 414]).toContain(response.status);
      expectProblem(response, response.status);
    });

    it.each(['?limit=1&limit=2', '?limit=x', '?unknown=1', '?__proto__[admin]=1', '?limit[]=1'])(
      'with the query %s is a 400',
      async (query) => expectProblem(await test.guest.get(`/trial${query}`), 400),
    );

    it('that declares no access is open to nobody', async () => {
      const steward = await test.create.user({ siteRole: 'siteAdmin' });
      expectProblem(await test.as(steward).get('/trial/undeclared'), 403);
    });
  });

  it('a failure of ours tells nothing of how we are made', async () => {
    const response = await test.guest.get('/trial/broken');
    expectProblem(response, 500);
    expect(response.text).not.toMatch(/SELECT|passwordHash|srv|\.js/);
  });

  it('too many tries are a 429 that says when', async () => {
    const response = await test.guest.get('/trial/too-many');
    expectProblem(response, 429);
    expect(response.headers['retry-after']).toBe('17');
  });

  it('gives back the id of the request, of a proxy or its own', async () => {
    const own = await test.guest.get('/nowhere');
    expect(own.headers['x-request-id']).toMatch(/^[\w-]{8}-\d+$/);
    const given = await test.guest.get('/nowhere').set('x-request-id', 'edge-17');
    expect(given.headers['x-request-id']).toBe('edge-17');
  });

  it.each(['/health/live', '/nowhere', '/trial/broken'])(
    'guards the answer of %s by its headers',
    async (path) => {
      const { headers } = await test.guest.get(path).set('origin', 'https://elsewhere.example');
      expect(headers).toMatchObject({
        'content-security-policy': expect.stringMatching(/default-src 'none'.*frame-ancestors 'none'/),
        'x-content-type-options': 'nosniff',
        'referrer-policy': 'same-origin',
        'cross-origin-opener-policy': 'same-origin',
        'cache-control': 'no-store',
      });
      expect(headers['access-control-allow-origin']).toBeUndefined();
      expect(headers['x-powered-by']).toBeUndefined();
      expect(headers['server']).toBeUndefined();
      expect(headers['strict-transport-security']).toBeUndefined();
    },
  );

  it.each([
    { what: 'no request at all', sent: 'RUBBISH\r\n\r\n', status: 400 },
    {
      what: 'headers too large',
      sent: `GET / HTTP/1.1\r\nhost: x\r\nx: ${'y'.repeat(20_000)}\r\n\r\n`,
      status: 431,
    },
  ])('answers $what in the same form', async ({ sent, status }) => {
    const answer = await overSocket(sent);
    expect(answer).toMatch(new RegExp(`^HTTP/1.1 ${status} `));
    expect(answer).toContain('content-type: application/problem+json');
    expect(JSON.parse(answer.split('\r\n\r\n')[1]!)).toMatchObject({ type: 'about:blank', status });
  });

  const port = () => (test.server.address() as AddressInfo).port;

  function overSocket(sent: string): Promise<string> {
    return new Promise((resolve, reject) => {
      const socket = connect(port(), '127.0.0.1', () => socket.write(sent));
      let heard = '';
      socket.on('data', (chunk) => (heard += chunk.toString()));
      socket.on('close', () => resolve(heard));
      socket.on('error', reject);
    });
  }

  /** Sends the path as it stands, where other clients would tidy it. */
  function rawRequest(method: string, path: string): Promise<{ status: number; type: string }> {
    return new Promise((resolve, reject) => {
      httpRequest({ method, path, port: port(), host: '127.0.0.1' }, (response) => {
        response.resume();
        resolve({ status: response.statusCode ?? 0, type: response.headers['content-type'] ?? '' });
      })
        .on('error', reject)
        .end();
    });
  }
});

describe('over HTTPS', () => {
  it('asks browsers to come back that way only', async () => {
    const test = await startTestApp({ env: { PUBLIC_URL: 'https://chapter.example' } });
    const { headers } = await test.guest.get('/health/live');
    expect(headers['strict-transport-security']).toBe('max-age=31536000');
    await test.stop();
  });
});

import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { brotliCompressSync } from 'node:zlib';
import supertest from 'supertest';
import { startTestApp, type TestApp } from '../../testing/start-test-app.js';

const SCRIPT = 'console.log("the page")';
const PAGE = `<!doctype html><meta name="csp-nonce" content="__CSP_NONCE__"><style nonce="__CSP_NONCE__"></style>
<script nonce="__CSP_NONCE__" type="module" src="/assets/main-a1b2c3.js"></script><div id="root"></div>`;

function builtPage(): string {
  const root = mkdtempSync(join(tmpdir(), 'rivetside-web-'));
  mkdirSync(join(root, 'assets'));
  writeFileSync(join(root, 'index.html'), PAGE);
  writeFileSync(join(root, 'index.html.br'), brotliCompressSync(PAGE));
  writeFileSync(join(root, 'sw.js'), SCRIPT);
  writeFileSync(join(root, 'assets/main-a1b2c3.js'), SCRIPT);
  writeFileSync(join(root, 'assets/main-a1b2c3.js.br'), brotliCompressSync(SCRIPT));
  writeFileSync(join(root, 'assets/main-a1b2c3.js.map'), '{}');
  return root;
}

describe('the page', () => {
  let test: TestApp;
  const webRoot = builtPage();
  beforeAll(async () => {
    test = await startTestApp({ webRoot, env: { NODE_ENV: 'production', JWT_SECRET: 'x'.repeat(40) } });
  });
  afterAll(async () => {
    await test.stop();
    rmSync(webRoot, { recursive: true, force: true });
  });
  const get = (path: string) => supertest(test.server).get(path);

  it.each([
    '/',
    '/bench',
    '/sections/018f0000-0000-7000-8000-000000000000',
    '/search?q=0.387',
    '/index.html',
  ])('is what a person gets at %s', async (path) => {
    const { text, headers } = await get(path).set('accept', 'text/html,*/*;q=0.8').expect(200);
    expect(text).toContain('<div id="root">');
    expect(headers['content-type']).toBe('text/html; charset=utf-8');
    expect(headers['cache-control']).toBe('no-cache');
  });

  it('carries one nonce a view, the same in its policy and in every place of it', async () => {
    const [first, second] = [await get('/'), await get('/')];
    const nonceOf = ({ headers }: supertest.Response) =>
      /script-src 'self' 'nonce-([^']+)'/.exec(headers['content-security-policy'] as string)![1]!;
    expect(nonceOf(first)).not.toBe(nonceOf(second));
    expect(first.text).not.toContain('__CSP_NONCE__');
    expect(first.text.split(nonceOf(first))).toHaveLength(4);
    expect(first.headers['content-security-policy']).toContain(`style-src 'self' 'nonce-${nonceOf(first)}'`);
  });

  it('allows nothing unsafe and is framed by nobody', async () => {
    const { headers } = await get('/');
    expect(headers['content-security-policy']).not.toContain('unsafe');
    expect(headers['content-security-policy']).toContain("frame-ancestors 'none'");
    expect(headers['x-content-type-options']).toBe('nosniff');
  });

  it('comes with its files, compressed beforehand and kept for a year', async () => {
    const { headers, text } = await get('/assets/main-a1b2c3.js').set('accept-encoding', 'br').expect(200);
    expect(headers).toMatchObject({
      'content-encoding': 'br',
      'cache-control': 'public, max-age=31536000, immutable',
      vary: expect.stringMatching(/accept-encoding/i),
      'content-type': expect.stringContaining('javascript'),
    });
    expect(text).toBe(SCRIPT);
  });

  it('comes with its files as they are for who cannot take them compressed', async () => {
    const { headers, text } = await get('/assets/main-a1b2c3.js')
      .set('accept-encoding', 'identity')
      .expect(200);
    expect(headers['content-encoding']).toBeUndefined();
    expect(text).toBe(SCRIPT);
  });

  it('has its worker asked for again each time', async () => {
    const { headers } = await get('/sw.js').expect(200);
    expect(headers['cache-control']).toBe('no-cache');
    expect(headers['content-security-policy']).toContain("connect-src 'self'");
  });

  it.each(['/assets/gone.js', '/assets/', '/assets', '/api/nowhere', '/nowhere.png', '/dev/nowhere', '/api'])(
    'does not stand in for %s',
    async (path) => {
      const { headers } = await get(path).set('accept', '*/*').expect(404);
      expect(headers['content-type']).toContain('application/problem+json');
    },
  );

  it('does not stand in for data', async () => {
    await get('/bench').set('accept', 'application/json').expect(404);
    await supertest(test.server).post('/bench').expect(404);
  });

  it.each(['/assets/main-a1b2c3.js.map', '/assets/main-a1b2c3.js.br', '/index.html.br', '/dev/mail'])(
    'keeps %s to itself in production',
    async (path) => void (await get(path).expect(404)),
  );

  it.each(['/..%2f..%2fetc/passwd', '/assets/..%2f..%2f..%2fetc%2fpasswd', '/%2e%2e/%2e%2e/etc/passwd'])(
    'gives no file outside its folder: %s',
    async (path) => expect((await get(path)).text).not.toContain('root:'),
  );
});

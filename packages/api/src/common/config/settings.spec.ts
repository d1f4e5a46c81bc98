import { mkdtempSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { readEnv, SettingsFault } from './env.js';
import { Settings } from './settings.js';

describe('the settings as the app asks for them', () => {
  let folder: string;
  beforeEach(() => (folder = mkdtempSync(join(tmpdir(), 'rivetside-settings-'))));
  afterEach(() => rmSync(folder, { recursive: true, force: true }));
  const settings = (given: Record<string, string | undefined> = {}) =>
    new Settings(readEnv({ DATA_DIR: join(folder, 'data'), ...given }));

  it('say in a sentence that the data folder cannot be written', () => {
    writeFileSync(join(folder, 'file'), '');
    const within = join(folder, 'file', 'data');
    expect(() => settings({ DATA_DIR: within })).toThrow(SettingsFault);
    expect(() => settings({ DATA_DIR: within })).toThrow(
      /^DATA_DIR .* cannot be written: make it writable or/,
    );
  });

  it('keep the secret that was made, for its owner alone', () => {
    const first = settings().jwtSecret;
    expect(first.length).toBeGreaterThanOrEqual(32);
    expect(settings().jwtSecret).toBe(first);
    expect(statSync(join(folder, 'data', 'jwt-secret')).mode & 0o077).toBe(0);
  });

  it.each([
    { given: {}, demo: true },
    { given: { DEMO: '0' }, demo: false },
    { given: { NODE_ENV: 'production', JWT_SECRET: 'x'.repeat(32) }, demo: false },
    { given: { NODE_ENV: 'production', JWT_SECRET: 'x'.repeat(32), DEMO: '1' }, demo: true },
  ])('show the demo: $demo with $given', ({ given, demo }) => expect(settings(given).demo).toBe(demo));

  it('tell https by the address that people use', () => {
    expect(settings({ PUBLIC_URL: 'https://chapter.example/' })).toMatchObject({
      https: true,
      publicUrl: 'https://chapter.example',
    });
    expect(settings({ PORT: '4000' })).toMatchObject({ https: false, publicUrl: 'http://localhost:4000' });
  });
});

import { spawnSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';

const PREPARE = pathToFileURL(join(__dirname, '../scripts/prepare.mjs')).href;

/** Runs one expression with what the script exports. */
function withPrepare(expression: string) {
  const script = `const prepare = await import(${JSON.stringify(PREPARE)}); console.log(${expression});`;
  return spawnSync(process.execPath, ['--input-type=module', '-e', script], { encoding: 'utf8' });
}

describe('what a start prepares', () => {
  it.each(['16.20.2', '18.20.8', '20.18.3'])('refuses Node %s in a sentence', (version) => {
    const { status, stderr } = withPrepare(`prepare.checkNode('${version}')`);
    expect(status).toBe(1);
    expect(stderr.trim()).toBe(`Node 20.19 or newer is needed; this is ${version}.`);
  });

  it.each(['20.19.0', '20.20.2', '22.0.0', '24.1.0'])('takes Node %s', (version) =>
    expect(withPrepare(`prepare.checkNode('${version}')`).status).toBe(0),
  );

  describe('finds stale', () => {
    let folder: string;
    const at = (name: string, minute: number) => {
      const time = new Date(Date.UTC(2026, 0, 1, 12, minute));
      utimesSync(join(folder, name), time, time);
    };
    beforeEach(() => {
      folder = mkdtempSync(join(tmpdir(), 'rivetside-stale-'));
      mkdirSync(join(folder, 'src/deep'), { recursive: true });
      for (const name of ['built', 'src/deep/a.ts', 'src/b.ts']) writeFileSync(join(folder, name), '');
      for (const name of ['src/deep/a.ts', 'src/b.ts', 'src/deep', 'src']) at(name, 0);
      at('built', 1);
    });
    afterEach(() => rmSync(folder, { recursive: true, force: true }));
    const isStale = (built = 'built') => {
      const [one, src] = [built, 'src'].map((name) => JSON.stringify(join(folder, name)));
      return withPrepare(`prepare.isStale(${one}, [${src}])`).stdout.trim();
    };

    it('nothing that is newer than its sources', () => expect(isStale()).toBe('false'));
    it('what was never built', () => expect(isStale('nothing')).toBe('true'));
    it('what has a newer file below', () => {
      at('src/deep/a.ts', 2);
      expect(isStale()).toBe('true');
    });
    it('what has lost a file', () => {
      rmSync(join(folder, 'src/deep/a.ts'));
      expect(isStale()).toBe('true');
    });
  });
});

import { randomBytes } from 'node:crypto';
import { accessSync, constants, existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { type Env, SettingsFault } from './env.js';

const SECRET_FILE = 'jwt-secret';

/** The settings as the app asks for them. Made once, before anything else starts. */
export class Settings {
  readonly dataDir: string;
  readonly jwtSecret: string;

  constructor(readonly env: Env) {
    this.dataDir = resolve(env.DATA_DIR);
    this.prepareDataDir();
    this.jwtSecret = env.JWT_SECRET ?? this.keptSecret();
  }

  get production(): boolean {
    return this.env.NODE_ENV === 'production';
  }

  /** The demo world is loaded into an empty folder and its sign-ins are told. */
  get demo(): boolean {
    return this.env.DEMO === undefined ? !this.production : this.env.DEMO === '1';
  }

  /** Held for as long as this process writes. */
  get lockFile(): string {
    return join(this.dataDir, 'writer.lock');
  }

  get databaseFile(): string {
    return join(this.dataDir, 'rivetside.sqlite');
  }

  get publicUrl(): string {
    return (this.env.PUBLIC_URL ?? `http://localhost:${this.env.PORT}`).replace(/\/$/, '');
  }

  get https(): boolean {
    return this.publicUrl.startsWith('https:');
  }

  /** One process writes; the others serve reads and sockets. */
  get writes(): boolean {
    return this.env.ROLE === 'main';
  }

  private prepareDataDir(): void {
    try {
      mkdirSync(this.dataDir, { recursive: true });
      accessSync(this.dataDir, constants.W_OK);
    } catch {
      throw new SettingsFault([
        `DATA_DIR ${this.dataDir} cannot be written: make it writable or choose another folder.`,
      ]);
    }
  }

  /** Outside production a secret is made once and kept, so that a restart does not sign everybody out. */
  private keptSecret(): string {
    const file = join(this.dataDir, SECRET_FILE);
    if (!existsSync(file)) writeFileSync(file, randomBytes(48).toString('base64url'), { mode: 0o600 });
    return readFileSync(file, 'utf8').trim();
  }
}

import { join } from 'node:path';
import Database from 'better-sqlite3';
import { type FitCheck, fitCheck, headlineTrouble, type HoleCard } from '@rivetside/shared';
import { readEnv } from '../common/config/env.js';
import { Settings } from '../common/config/settings.js';
import { PreparedDb } from '../common/database/prepared.js';
import { newId } from '../common/ids.js';
import { migrate } from '../database/migrate.js';
import { SearchIndexService } from '../features/search/search-index.service.js';

export interface BenchWorld {
  readonly dataDir: string;
  readonly databaseFile: string;
  readonly userId: string;
  readonly sessionId: string;
  readonly chapterId: string;
  readonly kitId: string;
  /** Those that the reader may see. */
  readonly questionIds: readonly string[];
  readonly questions: number;
  readonly events: number;
}

const SECTIONS = 10;
const CHAPTERS = 5;
const TRADE =
  'spar rib skin hole edge rivet shop head drill burr doubler flange web bend crack clearance nutplate gap row pitch'.split(
    ' ',
  );
const SYLLABLES = 'ba ce di fo gu la me ni po ru sa te vi zo'.split(' ');
/** Few words are said often and many seldom, as in any talk. */
const WORDS = [
  ...TRADE,
  ...SYLLABLES.flatMap((a) => SYLLABLES.flatMap((b) => SYLLABLES.map((c) => a + b + c))),
];
const START = Date.parse('2024-01-01T00:00:00.000Z');
const SECRET = 'a secret for measuring only, long enough';

export const benchEnv = (dataDir: string) => ({
  NODE_ENV: 'production',
  DATA_DIR: dataDir,
  DEMO: '0',
  LOG_LEVEL: 'silent',
  JWT_SECRET: SECRET,
  PUBLIC_URL: 'http://localhost',
});

/** The same numbers at every run: what is measured must not depend on luck. */
function lots(): (below: number) => number {
  let state = 12_345;
  return (below) => {
    state = (state * 1_103_515_245 + 12_345) % 2_147_483_648;
    return Math.floor((state / 2_147_483_648) * below);
  };
}

function card(edge: number): HoleCard {
  const layer = (name: string, y: number) => ({
    name,
    alloy: '2024-T3 clad' as const,
    thickness: 0.04,
    hole: { shape: 'round' as const, diameter: 0.1285 },
    offset: { x: 0, y },
    edges: [{ distance: edge, angle: 270 }],
    bends: [],
  });
  return {
    layers: [layer('spar', 0), layer('doubler', 0.02)],
    rivet: { head: 'universal', alloy: 'AD', dash: 4 },
    neighbours: [{ x: 0.75, y: 0, dash: 4 }],
    access: 'both',
  };
}

interface Places {
  readonly chapterIds: string[];
  readonly kitId: string;
  readonly sectionIds: string[];
  readonly userId: string;
  readonly sessionId: string;
}

type Row = Record<string, string | number | null>;

function insert(db: PreparedDb, table: string, row: Row): void {
  const names = Object.keys(row).map((name) => `"${name}"`);
  const values = names.map(() => '?').join(', ');
  db.run(`INSERT INTO "${table}" (${names.join(', ')}) VALUES (${values})`, Object.values(row));
}

/** The reader: a builder and mentor of the first chapter. */
function seedReader(db: PreparedDb, chapterId: string): { userId: string; sessionId: string } {
  const at = new Date(START).toISOString();
  const userId = newId();
  const sessionId = newId();
  const account = {
    email: 'bench@test.example',
    name: 'Bench',
    passwordHash: '-',
    units: 'inch',
    zone: 'Europe/London',
  };
  const rights = { siteRole: null, disabledAt: null, emailConfirmedAt: at, createdAt: at };
  insert(db, 'users', { id: userId, ...account, ...rights });
  const session = { device: 'bench', createdAt: at, lastUsedAt: at, endedAt: null, endedReason: null };
  insert(db, 'sessions', { id: sessionId, userId, ...session });
  const standing = {
    roles: '["builder","mentor"]',
    disciplines: '["riveting"]',
    status: 'active',
    stampNumber: 'M-01',
  };
  insert(db, 'memberships', { id: newId(), chapterId, userId, ...standing, joinedAt: at });
  return { userId, sessionId };
}

/** Everything a question hangs on. */
function seedPlaces(db: PreparedDb): Places {
  const createdAt = new Date(START).toISOString();
  const kitId = newId();
  insert(db, 'kits', { id: kitId, name: 'Bench kit', maker: 'Nobody', kind: 'two seats' });
  const chapterIds = Array.from({ length: CHAPTERS }, () => newId());
  for (const [number, id] of chapterIds.entries()) {
    const rest = { zone: 'Europe/London', currency: 'GBP', meets: '', place: '', joining: 'open', createdAt };
    insert(db, 'chapters', { id, key: `B${number}`, name: `Chapter ${number}`, ...rest });
    insert(db, 'kit_chapters', { kitId, chapterId: id });
  }
  const sectionIds = Array.from({ length: SECTIONS }, () => newId());
  for (const [number, id] of sectionIds.entries()) {
    const facts = {
      code: `S${number}`,
      name: `Section ${number}`,
      position: number,
      critical: 0,
      regions: '["L-stab"]',
    };
    insert(db, 'sections', { id, kitId, ...facts, stewardId: null });
  }
  return { chapterIds, kitId, sectionIds, ...seedReader(db, chapterIds[0]!) };
}

const ASK = `INSERT INTO "questions" ("id", "number", "kitId", "sectionId", "holes", "chapterId", "audience", "discipline", "mishap", "title", "body",
    "holeCard", "fitCheck", "headline", "askedById", "askedAt", "state", "waitsFor", "waitsSince", "lastSeq", "lastActivityAt")
  VALUES (?, ?, ?, ?, '[]', ?, ?, 'riveting', 'misalignedHole', ?, ?, ?, ?, ?, ?, ?, 'open', 'firstFix', ?, ?, ?)`;
const EVENT = `INSERT INTO "question_events" ("questionId", "seq", "id", "type", "at", "byId", "data") VALUES (?, ?, ?, ?, ?, ?, ?)`;

/** A database of its own with so many questions and events, talk indexed as the app indexes it. */
export async function seedBench(dataDir: string, questions: number, events: number): Promise<BenchWorld> {
  const settings = new Settings(readEnv(benchEnv(dataDir)));
  await migrate(settings);
  const databaseFile = join(dataDir, 'rivetside.sqlite');
  const database = new Database(databaseFile);
  // Only while it is filled; the servers that are measured set their own.
  database.pragma('journal_mode = WAL');
  database.pragma('synchronous = OFF');
  const db = new PreparedDb(database);
  const places = seedPlaces(db);
  const checked = [0.4, 0.3, 0.26, 0.15].map((edge) => {
    const check: FitCheck = fitCheck(card(edge));
    const headline = headlineTrouble('misalignedHole', check);
    return [card(edge), check, headline].map((value) => JSON.stringify(value)) as [string, string, string];
  });
  const questionIds: string[] = [];
  const perQuestion = Math.floor(events / questions);
  const fill = database.transaction((from: number, to: number) => {
    for (let number = from; number < to; number += 1) {
      const filling = { number, talk: perQuestion, checked: checked[number % 4]! };
      const id = seedQuestion(db, places, filling);
      if (mayBeSeen(number)) questionIds.push(id);
    }
  });
  for (let from = 0; from < questions; from += 2_000) fill(from, Math.min(questions, from + 2_000));
  database.exec('ANALYZE');
  database.pragma('wal_checkpoint(TRUNCATE)');
  database.close();
  const { userId, sessionId, chapterIds, kitId } = places;
  return {
    dataDir,
    databaseFile,
    userId,
    sessionId,
    chapterId: chapterIds[0]!,
    kitId,
    questionIds,
    questions,
    events,
  };
}

const index = new SearchIndexService();
const lot = lots();
const word = () => WORDS[Math.floor((lot(1_000_000) / 1_000_000) ** 2 * WORDS.length)];
const sentence = (words: number) => Array.from({ length: words }, word).join(' ');

interface Filling {
  readonly number: number;
  /** Events, the asking among them. */
  readonly talk: number;
  readonly checked: readonly [card: string, check: string, headline: string];
}

const isShared = (number: number) => number % 3 === 0;
const mayBeSeen = (number: number) => isShared(number) || number % CHAPTERS === 0;

function seedQuestion(db: PreparedDb, places: Places, { number, talk, checked }: Filling): string {
  const id = newId();
  const { kitId, userId } = places;
  const chapterId = places.chapterIds[number % CHAPTERS]!;
  const audience = isShared(number) ? 'kit' : 'chapter';
  const at = new Date(START + number * 60_000).toISOString();
  const title = `${sentence(5)} 0.${100 + (number % 800)} AD${3 + (number % 4)}`;
  const body = sentence(40);
  const place = `B-Q-${number}`;
  const section = places.sectionIds[number % SECTIONS]!;
  db.run(ASK, [
    id,
    place,
    kitId,
    section,
    chapterId,
    audience,
    title,
    body,
    ...checked,
    userId,
    at,
    at,
    talk,
    at,
  ]);
  const found = { questionId: id, kitId, chapterId: audience === 'kit' ? null : chapterId };
  index.add(db, { ...found, kind: 'question', refId: id, title, place, words: body });
  db.run(EVENT, [id, 1, newId(), 'asked', at, userId, '{}']);
  for (let seq = 2; seq <= talk; seq += 1) {
    const messageId = newId();
    const said = sentence(20);
    const data = JSON.stringify({ id: messageId, body: said });
    db.run(EVENT, [id, seq, messageId, 'message', at, userId, data]);
    index.add(db, { ...found, kind: 'message', refId: messageId, title: '', words: said });
  }
  return id;
}

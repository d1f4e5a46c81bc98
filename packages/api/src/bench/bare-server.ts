import { createServer, type IncomingMessage, type ServerResponse } from 'node:http';
import Database from 'better-sqlite3';
import { EVENTS_ON_SHEET, excerptOf, fragmentsOf, searchQuery } from '@rivetside/shared';
import { WebSocket, WebSocketServer } from 'ws';
import { prepareReader, prepareWriter } from '../common/database/pragmas.js';
import { PreparedDb, PreparedStatements } from '../common/database/prepared.js';
import { newId } from '../common/ids.js';
import {
  type EventRow,
  type ListRow,
  presentEvent,
  presentRow,
} from '../features/questions/question-rows.js';
import * as sql from '../features/questions/questions.sql.js';
import { ON_QUESTION } from '../features/photos/photos.sql.js';
import { QUESTION_OF_HIT, SEARCH } from '../features/search/search.sql.js';
import { SearchIndexService } from '../features/search/search-index.service.js';

/**
 * What the app is measured against: node:http and better-sqlite3 with the same statements and the same JSON, and
 * nothing else: no session, no policy, no check of what comes in. Parent process passes where and for whom.
 */
const { BENCH_FILE = '', BENCH_USER = '', BENCH_CHAPTER = '', BENCH_KIT = '' } = process.env;

const readerFile = new Database(BENCH_FILE, { readonly: true });
prepareReader(readerFile);
const reader = new PreparedStatements(readerFile);
const writerFile = new Database(BENCH_FILE);
prepareWriter(writerFile);
const writer = new PreparedDb(writerFile);
const index = new SearchIndexService();
const sight = { chapters: JSON.stringify([BENCH_CHAPTER]), kits: JSON.stringify([BENCH_KIT]) };

function list(): unknown {
  const rows = reader.all<ListRow>(sql.listSql([], 'activity', false, false), {
    ...sight,
    userId: BENCH_USER,
    limit: 31,
  });
  return { items: rows.slice(0, 30).map(presentRow), nextCursor: 'more' };
}

function sheet(id: string): unknown {
  const row = reader.get<ListRow & Record<string, string>>(sql.SHEET, { id, userId: BENCH_USER })!;
  const events = reader.all<EventRow>(sql.EVENTS_BEFORE, [id, Number.MAX_SAFE_INTEGER, EVENTS_ON_SHEET]);
  return {
    ...presentRow(row),
    body: row['body'],
    kitName: row['kitName'],
    holes: JSON.parse(row['holes']!),
    holeCard: JSON.parse(row['holeCard']!),
    fitCheck: JSON.parse(row['fitCheck']!),
    photos: reader.all(ON_QUESTION, [id]),
    fixes: reader.all(sql.FIXES, [id]),
    referral: reader.get(sql.REFERRAL, [id]) ?? null,
    completion: null,
    events: events.reverse().map(presentEvent),
  };
}

interface Hit {
  questionId: string;
  docWords: string;
}

function search(q: string): unknown {
  const rows = reader.all<Hit>(SEARCH, [searchQuery(q), sight.chapters, sight.kits, 300]);
  const best = new Map<string, Hit>();
  for (const row of rows) if (!best.has(row.questionId)) best.set(row.questionId, row);
  const items = [...best.values()].slice(0, 20).map(({ questionId, docWords }) => {
    const { number, title, state } = reader.get<Record<string, string>>(QUESTION_OF_HIT, [
      '2026-12-01',
      questionId,
    ])!;
    return {
      kind: 'question',
      id: questionId,
      title: fragmentsOf(title!, q),
      place: number,
      excerpt: excerptOf(docWords, q),
      state,
    };
  });
  return { items, nextCursor: null };
}

const post = writerFile.transaction((questionId: string, body: string) => {
  const at = new Date().toISOString();
  const id = newId();
  const { lastSeq: seq } = writer.get<{ lastSeq: number }>(sql.NEXT_SEQ, [at, questionId])!;
  const data = { id, body };
  writer.run(sql.ADD_EVENT, [questionId, seq, id, 'message', at, BENCH_USER, JSON.stringify(data)]);
  index.add(writer, {
    kind: 'message',
    refId: id,
    questionId,
    kitId: BENCH_KIT,
    chapterId: BENCH_CHAPTER,
    title: '',
    words: body,
  });
  writer.run(sql.SEEN, [BENCH_USER, questionId, seq]);
  return {
    questionId,
    seq,
    type: 'message',
    at,
    by: { id: BENCH_USER, name: 'Bench' },
    data: { ...data, photos: [] },
  };
});

function write(questionId: string, request: IncomingMessage, response: ServerResponse): void {
  let text = '';
  request.on('data', (chunk: Buffer) => (text += chunk.toString()));
  request.on('end', () => {
    const event = post.immediate(questionId, (JSON.parse(text) as { body: string }).body);
    const message = JSON.stringify(event);
    for (const client of sockets.clients) if (client.readyState === WebSocket.OPEN) client.send(message);
    answer(response, 201, event);
  });
}

function answer(response: ServerResponse, status: number, value: unknown): void {
  const body = JSON.stringify(value);
  response
    .writeHead(status, { 'content-type': 'application/json', 'content-length': Buffer.byteLength(body) })
    .end(body);
}

const server = createServer((request, response) => {
  const { pathname, searchParams } = new URL(request.url!, 'http://localhost');
  const [, , , id = ''] = pathname.split('/');
  if (request.method === 'POST') write(id, request, response);
  else if (pathname === '/api/search') answer(response, 200, search(searchParams.get('q')!));
  else answer(response, 200, id === '' ? list() : sheet(id));
});
const sockets = new WebSocketServer({ server, perMessageDeflate: false });
server.listen(0, '127.0.0.1', () => process.send?.({ port: (server.address() as { port: number }).port }));
process.on('disconnect', () => process.exit(0));

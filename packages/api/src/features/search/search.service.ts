import { Injectable } from '@nestjs/common';
import {
  type Actor,
  activeChapterIds,
  excerptOf,
  fragmentsOf,
  type Page,
  type QuestionState,
  type SearchHit,
  type SearchKind,
  searchQuery,
  type SearchRequest,
} from '@rivetside/shared';
import { decodeCursor, encodeCursor } from '../../common/database/cursor.js';
import { PreparedReader } from '../../common/database/prepared-reader.js';
import { Clock } from '../../common/time/clock.js';
import {
  ALL_CHAPTERS,
  ALL_KITS,
  KITS_OF_CHAPTERS,
  QUESTION_OF_HIT,
  SEARCH,
  SECTION_OF,
} from './search.sql.js';

const USUAL = 20;
/** Rows looked at before grouping: talk under one question folds into one hit. */
const ROWS_LOOKED_AT = 300;

interface HitRow {
  kind: SearchKind | 'message' | 'fix';
  refId: string;
  questionId: string | null;
  docTitle: string;
  docPlace: string;
  docWords: string;
}
interface QuestionRow {
  id: string;
  number: string;
  title: string;
  state: QuestionState;
  body: string;
  sectionName: string | null;
  partNumber: string | null;
  holeLineCode: string | null;
  standing: SearchHit['standing'];
}

@Injectable()
export class SearchService {
  constructor(
    private readonly reader: PreparedReader,
    private readonly clock: Clock,
  ) {}

  search(actor: Actor, { q, limit = USUAL, cursor }: SearchRequest): Page<SearchHit> {
    const from = cursor ? Number(decodeCursor(cursor)[0]) : 0;
    const groups = grouped(this.rows(actor, q));
    const shown = groups.slice(from, from + limit);
    const items = shown.flatMap((rows) => this.present(rows, q) ?? []);
    return { items, nextCursor: groups.length > from + limit ? encodeCursor([from + limit]) : null };
  }

  /** Ids of the questions found, best first, for the list. */
  questionHits(actor: Actor, q: string): string[] {
    return grouped(this.rows(actor, q).filter(({ questionId }) => questionId !== null)).map(
      (rows) => rows[0]!.questionId!,
    );
  }

  /** What was asked may hold one of the words and its fix another: where nothing holds all, any of them counts. */
  private rows(actor: Actor, q: string): HitRow[] {
    const { chapters, kits } = this.within(actor);
    const sight = [JSON.stringify(chapters), JSON.stringify(kits), ROWS_LOOKED_AT];
    const matching = (query: string | null) =>
      query === null ? [] : this.reader.all<HitRow>(SEARCH, [query, ...sight]);
    const all = matching(searchQuery(q));
    return all.length > 0 ? all : matching(searchQuery(q, 'any'));
  }

  private within(actor: Actor): { chapters: string[]; kits: string[] } {
    const keeper = actor.siteRole !== null;
    const chapters = keeper
      ? this.reader.all<{ id: string }>(ALL_CHAPTERS).map(({ id }) => id)
      : activeChapterIds(actor);
    const kits = keeper
      ? this.reader.all<{ kitId: string }>(ALL_KITS)
      : this.reader.all<{ kitId: string }>(KITS_OF_CHAPTERS, [JSON.stringify(chapters)]);
    return { chapters, kits: kits.map(({ kitId }) => kitId) };
  }

  private present(rows: HitRow[], q: string): SearchHit | null {
    const best = rows[0]!;
    if (best.questionId !== null) return this.presentQuestion(best.questionId, rows, q);
    const section = this.reader.get<{ sectionId: string }>(SECTION_OF[best.kind] ?? SECTION_OF['section']!, [
      best.refId,
    ]);
    return {
      kind: best.kind as SearchKind,
      id: best.refId,
      sectionId: section?.sectionId ?? null,
      title: fragmentsOf(best.docTitle, q),
      place: best.docPlace,
      excerpt: excerptOf(best.docWords, q),
      state: null,
      standing: null,
    };
  }

  private presentQuestion(questionId: string, rows: HitRow[], q: string): SearchHit | null {
    const today = this.clock.instant().slice(0, 10);
    const question = this.reader.get<QuestionRow>(QUESTION_OF_HIT, [today, questionId]);
    if (!question) return null;
    const said = rows.find(({ kind }) => kind !== 'question');
    return {
      kind: 'question',
      id: question.id,
      sectionId: null,
      title: fragmentsOf(question.title, q),
      place: [question.number, question.sectionName, question.partNumber, question.holeLineCode]
        .filter(Boolean)
        .join(' · '),
      excerpt: excerptOf(rows[0]!.kind === 'question' ? question.body : (said?.docWords ?? question.body), q),
      state: question.state,
      standing: question.standing,
    };
  }
}

/** Rows in order of rank, those of one question together at the place of its best. */
function grouped(rows: readonly HitRow[]): HitRow[][] {
  const groups = new Map<string, HitRow[]>();
  for (const row of rows) {
    const name = row.questionId ?? row.refId;
    const group = groups.get(name);
    if (group) group.push(row);
    else groups.set(name, [row]);
  }
  return [...groups.values()];
}

import { Injectable } from '@nestjs/common';
import { type Actor, type Page, PAGE_USUAL, type QuestionQuery, type QuestionRow } from '@rivetside/shared';
import { decodeCursor, pageOfRows } from '../../common/database/cursor.js';
import { PreparedReader } from '../../common/database/prepared-reader.js';
import { SearchService } from '../search/search.service.js';
import { QuestionDoorService } from './question-door.service.js';
import { type ListRow, presentRow } from './question-rows.js';
import { type FilterName, listSql, ROWS_BY_IDS } from './questions.sql.js';

const FILTER_NAMES = [
  'kitId',
  'sectionId',
  'partId',
  'holeLineId',
  'state',
  'discipline',
  'chapterId',
] as const;

@Injectable()
export class QuestionListService {
  constructor(
    private readonly reader: PreparedReader,
    private readonly door: QuestionDoorService,
    private readonly searching: SearchService,
  ) {}

  list(actor: Actor, query: QuestionQuery): Page<QuestionRow> {
    const { limit = PAGE_USUAL, cursor, sort = 'activity' } = query;
    const { chapters, kits, everything } = this.door.sightOf(actor);
    const filters = filtersOf(query);
    const [afterKey, afterId] = cursor ? decodeCursor(cursor) : [];
    const params: Record<string, string | number> = { userId: actor.id, limit: limit + 1 };
    if (!everything) Object.assign(params, { chapters, kits });
    for (const name of FILTER_NAMES) if (query[name] !== undefined) params[name] = query[name];
    if (query.q !== undefined) params['found'] = JSON.stringify(this.searching.questionHits(actor, query.q));
    if (cursor) Object.assign(params, { afterKey: String(afterKey), afterId: String(afterId ?? '') });
    const rows = this.reader.all<ListRow & { sortKey: string }>(
      listSql(filters, sort, cursor !== undefined, everything),
      params,
    );
    return pageOfRows(rows, limit, presentRow, (row) => [row.sortKey, row.id]);
  }

  /** Rows in the order of the ids; the caller has asked whether the actor may see them. */
  byIds(actor: Actor, ids: readonly string[]): QuestionRow[] {
    return this.reader
      .all<ListRow>(ROWS_BY_IDS, { ids: JSON.stringify(ids), userId: actor.id })
      .map(presentRow);
  }
}

function filtersOf(query: QuestionQuery): FilterName[] {
  const filters: FilterName[] = FILTER_NAMES.filter((name) => query[name] !== undefined);
  if (query.mine === 'true') filters.push('mine');
  if (query.q !== undefined) filters.push('found');
  return filters;
}

import { Injectable } from '@nestjs/common';
import { searchTerms } from '@rivetside/shared';
import type { PreparedDb } from '../../common/database/prepared.js';
import type { Tx } from '../../common/database/unit-of-work.js';
import type { SearchDocEntity } from './search-doc.entity.js';

export interface SearchDoc {
  readonly kind: SearchDocEntity['kind'];
  readonly refId: string;
  /** The question it belongs to, for what is asked, said and proposed there. */
  readonly questionId?: string | null;
  readonly kitId: string;
  /** Null where every member of a chapter of the kit may find it. */
  readonly chapterId?: string | null;
  readonly title: string;
  readonly place?: string;
  readonly words?: string;
}

const ADD_DOC = `INSERT INTO "search_docs" ("kind", "refId", "questionId", "kitId", "chapterId") VALUES (?, ?, ?, ?, ?)`;
const ADD_WORDS = `INSERT INTO "search_index" (rowid, title, place, words, numbers) VALUES (?, ?, ?, ?, ?)`;

/** Keeps what can be found, in the unit that writes what is found. */
@Injectable()
export class SearchIndexService {
  add(db: PreparedDb, doc: SearchDoc): void {
    const { kind, refId, questionId = null, kitId, chapterId = null, title, place = '', words = '' } = doc;
    const { lastInsertRowid } = db.run(ADD_DOC, [kind, refId, questionId, kitId, chapterId]);
    db.run(ADD_WORDS, [Number(lastInsertRowid), title, place, words, numbersOf(title, place, words)]);
  }

  async addIn(tx: Tx, doc: SearchDoc): Promise<void> {
    const { kind, refId, questionId = null, kitId, chapterId = null, title, place = '', words = '' } = doc;
    await tx.manager.query(ADD_DOC, [kind, refId, questionId, kitId, chapterId]);
    const numbers = numbersOf(title, place, words);
    await tx.manager.query(ADD_WORDS.replace('VALUES (?,', 'VALUES (last_insert_rowid(),'), [
      title,
      place,
      words,
      numbers,
    ]);
  }
}

function numbersOf(...texts: string[]): string {
  return searchTerms(texts.join(' ')).numbers.join(' ');
}

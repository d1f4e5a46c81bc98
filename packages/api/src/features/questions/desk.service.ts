import { Injectable } from '@nestjs/common';
import { type Actor, type Desk, type Discipline, isMentorFor, type QuestionRow } from '@rivetside/shared';
import { PreparedReader } from '../../common/database/prepared-reader.js';
import { QuestionDoorService } from './question-door.service.js';
import { type ListRow, presentRow } from './question-rows.js';
import { DESK_FIRST_FIX, DESK_REVIEW, DESK_STAMP } from './questions.sql.js';

/** What needs a mentor most, the longest waiting first. */
@Injectable()
export class DeskService {
  constructor(
    private readonly reader: PreparedReader,
    private readonly door: QuestionDoorService,
  ) {}

  of(actor: Actor): Desk {
    const { chapters, kits } = this.door.sightOf(actor);
    const sight = { chapters, kits, userId: actor.id, disciplines: JSON.stringify(disciplinesOf(actor)) };
    const rows = (sql: string) =>
      this.ownDisciplines(actor, this.reader.all<ListRow>(sql, sight).map(presentRow));
    return { firstFix: rows(DESK_FIRST_FIX), stamp: rows(DESK_STAMP), review: rows(DESK_REVIEW) };
  }

  /** A discipline held in one chapter gives no standing in another: the list is cut coarsely, then asked one by one. */
  private ownDisciplines(actor: Actor, rows: QuestionRow[]): QuestionRow[] {
    return rows.filter(({ id }) => {
      const question = this.door.find(id);
      return question !== null && isMentorFor(actor, question) && !question.builderIds.includes(actor.id);
    });
  }
}

function disciplinesOf(actor: Actor): Discipline[] {
  const mentoring = actor.memberships.filter(
    ({ status, roles }) => status === 'active' && roles.includes('mentor'),
  );
  return [...new Set(mentoring.flatMap(({ disciplines }) => disciplines))];
}

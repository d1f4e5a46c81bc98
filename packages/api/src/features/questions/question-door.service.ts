import { Injectable } from '@nestjs/common';
import {
  type Actor,
  activeChapterIds,
  type Audience,
  canSeeQuestion,
  type Discipline,
  type QuestionStanding,
  type QuestionState,
} from '@rivetside/shared';
import { PreparedReader } from '../../common/database/prepared-reader.js';
import { NotFound } from '../../common/errors/app-error.js';
import { KITS_OF_CHAPTERS, STANDING } from './questions.sql.js';

interface StandingRow {
  id: string;
  number: string;
  kitId: string;
  sectionId: string | null;
  buildId: string | null;
  chapterId: string;
  audience: Audience;
  discipline: Discipline;
  askedById: string;
  state: QuestionState;
  lastSeq: number;
  critical: number;
  holeCard: string | null;
  holeLineId: string | null;
  /** JSON lists of ids. */
  kitChapterIds: string;
  builderIds: string;
}

/** A question as policies and writes need it. */
export interface KnownQuestion extends QuestionStanding {
  readonly id: string;
  readonly number: string;
  readonly kitId: string;
  readonly sectionId: string | null;
  readonly buildId: string | null;
  readonly holeLineId: string | null;
  readonly lastSeq: number;
  readonly critical: boolean;
  readonly holeCardText: string | null;
}

/** Asked at every way in: whoever may not see a question learns nothing of it. */
@Injectable()
export class QuestionDoorService {
  constructor(private readonly reader: PreparedReader) {}

  find(id: string): KnownQuestion | null {
    const row = this.reader.get<StandingRow>(STANDING, [id]);
    if (!row) return null;
    const { holeCard, critical, ...facts } = row;
    return {
      ...facts,
      critical: critical === 1,
      holeCardText: holeCard,
      kitChapterIds: JSON.parse(row.kitChapterIds) as string[],
      builderIds: JSON.parse(row.builderIds) as string[],
    };
  }

  requireVisible(actor: Actor, id: string): KnownQuestion {
    const question = this.find(id);
    if (!question || !canSeeQuestion(actor, question)) throw new NotFound('question');
    return question;
  }

  /** What a list is cut by. */
  sightOf(actor: Actor): { chapters: string; kits: string; everything: boolean } {
    const chapters = JSON.stringify(activeChapterIds(actor));
    const kits = this.reader.all<{ kitId: string }>(KITS_OF_CHAPTERS, [chapters]).map(({ kitId }) => kitId);
    return { chapters, kits: JSON.stringify(kits), everything: actor.siteRole !== null };
  }
}

/** The chapter within which it is found; null where every chapter of the kit may. */
export function wall(question: Pick<KnownQuestion, 'audience' | 'chapterId'>): string | null {
  return question.audience === 'kit' ? null : question.chapterId;
}

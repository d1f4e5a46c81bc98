import { Injectable } from '@nestjs/common';
import type { Tx } from '../../common/database/unit-of-work.js';
import { BuildsService } from '../builds/builds.service.js';
import type { KnownQuestion } from '../questions/question-door.service.js';

const CARRIED_OUT = 'SELECT 1 AS "yes" FROM "completions" WHERE "fixId" = ?';

/** Who carried a fix out on a stamp that no longer stands has something to look at before the section is closed. */
@Injectable()
export class StampFollowUp {
  constructor(private readonly builds: BuildsService) {}

  async raise(tx: Tx, question: KnownQuestion, { fixId }: { fixId: string }, why: string): Promise<void> {
    const { buildId, sectionId, id: questionId, number } = question;
    if (buildId === null) return;
    const carriedOut = (await tx.manager.query(CARRIED_OUT, [fixId])) as unknown[];
    if (carriedOut.length === 0) return;
    const text = `${number}: look at it again, ${why}`;
    await this.builds.raiseOpenItem(tx, {
      buildId,
      sectionId,
      questionId,
      text,
      due: 'before the section is closed',
    });
  }
}

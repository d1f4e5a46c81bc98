import { Injectable } from '@nestjs/common';
import type { Actor, AskQuestion, HoleCard, KitLimits } from '@rivetside/shared';
import { PreparedReader } from '../../common/database/prepared-reader.js';
import { BadInput, type FieldFault } from '../../common/errors/app-error.js';
import { BuildsService } from '../builds/builds.service.js';

export interface Place {
  readonly kitName: string;
  readonly sectionCode: string | null;
  /** Where it is, in words, for the search. */
  readonly words: string;
  readonly buildId: string | null;
  readonly limits: KitLimits | null;
}

const KIT = 'SELECT "name" FROM "kits" WHERE "id" = ?';
const BUILDS_KIT = 'SELECT 1 AS "yes" FROM "kit_chapters" WHERE "kitId" = ? AND "chapterId" = ?';
const SECTION = 'SELECT "kitId", "code", "name" FROM "sections" WHERE "id" = ?';
const STEP = 'SELECT "sectionId", "code" || \' \' || "title" AS "name" FROM "steps" WHERE "id" = ?';
const PART = 'SELECT "sectionId", "number" || \' \' || "name" AS "name" FROM "parts" WHERE "id" = ?';
const HOLE_LINE =
  'SELECT "sectionId", "code" || \' \' || "title" || \' \' || "callOut" AS "name", "count", "repeats", "limits" FROM "hole_lines" WHERE "id" = ?';

interface Within {
  sectionId: string;
  name: string;
}
type HoleLineRow = Within & { count: number; repeats: number; limits: string | null };

/** Where a question is pinned: every name must be of the same kit and section, every hole must exist. */
@Injectable()
export class QuestionPlaceService {
  constructor(
    private readonly reader: PreparedReader,
    private readonly builds: BuildsService,
  ) {}

  find(actor: Actor, input: AskQuestion): Place {
    const faults: FieldFault[] = [];
    const kitName = this.kitName(input, faults);
    const section = input.sectionId
      ? this.reader.get<{ kitId: string; code: string; name: string }>(SECTION, [input.sectionId])
      : null;
    if (input.sectionId && section?.kitId !== input.kitId)
      faults.push({ path: 'sectionId', message: 'This section is not in that kit.' });
    const within = this.within(input, faults);
    const buildId = this.buildOf(actor, input, faults);
    if (faults.length > 0) throw new BadInput(faults);
    const words = [section?.name, ...within.names].filter(Boolean).join(' · ');
    return { kitName, sectionCode: section?.code ?? null, words, buildId, limits: within.limits };
  }

  private kitName({ kitId, chapterId }: AskQuestion, faults: FieldFault[]): string {
    const kit = this.reader.get<{ name: string }>(KIT, [kitId]);
    if (!kit) faults.push({ path: 'kitId', message: 'There is no such kit.' });
    else if (!this.reader.get(BUILDS_KIT, [kitId, chapterId]))
      faults.push({ path: 'chapterId', message: 'This chapter does not build that kit.' });
    return kit?.name ?? '';
  }

  private within(input: AskQuestion, faults: FieldFault[]): { names: string[]; limits: KitLimits | null } {
    const step = this.inSection(STEP, 'stepId', input, faults);
    const part = this.inSection(PART, 'partId', input, faults);
    const line = this.inSection<HoleLineRow>(HOLE_LINE, 'holeLineId', input, faults);
    for (const [at, { repeat, hole }] of (input.holes ?? []).entries()) {
      if (!line) continue;
      if (hole > line.count)
        faults.push({ path: `holes.${at}.hole`, message: `This line has ${line.count} holes.` });
      if (repeat > line.repeats)
        faults.push({ path: `holes.${at}.repeat`, message: `This line is there ${line.repeats} times.` });
    }
    const names = [step, part, line].flatMap((one) => (one ? [one.name] : []));
    return { names, limits: line?.limits ? (JSON.parse(line.limits) as KitLimits) : null };
  }

  /** A part may be met in another section than its own, such as a spar in a skin's line; steps and lines may not. */
  private inSection<Row extends Within = Within>(
    sql: string,
    path: 'stepId' | 'partId' | 'holeLineId',
    input: AskQuestion,
    faults: FieldFault[],
  ): Row | null {
    const id = input[path];
    if (!id) return null;
    const row = this.reader.get<Row>(sql, [id]);
    if (!row) faults.push({ path, message: 'There is no such place in that kit.' });
    else if (path !== 'partId' && row.sectionId !== input.sectionId)
      faults.push({ path, message: 'This is in another section.' });
    return row ?? null;
  }

  /** The asker's only aircraft of that kit, unless they name one that they own or help on. */
  private buildOf(actor: Actor, { buildId, kitId }: AskQuestion, faults: FieldFault[]): string | null {
    const own = this.builds.own(actor).filter((build) => build.kitId === kitId);
    if (!buildId) return own.length === 1 ? own[0]!.id : null;
    if (!own.some(({ id }) => id === buildId))
      faults.push({ path: 'buildId', message: 'This aircraft is not yours to ask for.' });
    return buildId;
  }
}

/** The kit maker's limits of the hole line stand on the card, unless the card brings its own. */
export function cardWithLimits(card: HoleCard | null | undefined, limits: KitLimits | null): HoleCard | null {
  if (!card) return null;
  return card.limits || !limits ? card : { ...card, limits };
}

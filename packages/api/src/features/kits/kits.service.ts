import { Injectable } from '@nestjs/common';
import {
  type Actor,
  activeChapterIds,
  type HoleLine,
  type Kit,
  type Part,
  type Section,
  type SectionSummary,
} from '@rivetside/shared';
import { PreparedReader } from '../../common/database/prepared-reader.js';
import { NotFound } from '../../common/errors/app-error.js';
import {
  type HoleLineRow,
  type MetHereRow,
  type NoticeRow,
  presentHoleLine,
  presentMetHere,
  presentNotice,
  presentPart,
  presentSection,
  presentStep,
  type SectionRow,
  type StepRow,
} from './kit-rows.js';
import * as sql from './kits.sql.js';

const NO_QUESTIONS = { waiting: 0, underReview: 0, total: 0 };

/** Reads the kit as its steward keeps it, with what the reader may see of questions and their own progress. */
@Injectable()
export class KitsService {
  constructor(private readonly reader: PreparedReader) {}

  list(): Kit[] {
    return this.reader.all<Kit>(sql.KITS);
  }

  requireById(id: string): Kit {
    const kit = this.list().find((one) => one.id === id);
    if (!kit) throw new NotFound('kit');
    return kit;
  }

  sections(actor: Actor, kitId: string): SectionSummary[] {
    this.requireById(kitId);
    const rows = this.reader.all<SectionRow>(sql.SECTIONS_OF_KIT, { kitId });
    return this.summaries(actor, kitId, rows);
  }

  section(actor: Actor, sectionId: string): Section {
    const row = this.reader.get<SectionRow>(sql.SECTION_BY_ID, { sectionId });
    if (!row) throw new NotFound('section');
    const sight = { ...sightOf(actor), sectionId };
    const [summary] = this.summaries(actor, row.kitId, [row]);
    const notices = this.reader.all<NoticeRow>(sql.NOTICES, { kitId: row.kitId }).map(presentNotice);
    return {
      ...summary!,
      kitName: row.kitName,
      steward: row.steward,
      steps: this.reader.all<StepRow>(sql.STEPS, { sectionId }).map(presentStep),
      parts: this.reader.all<Part>(sql.PARTS, sight).map(presentPart),
      holeLines: this.reader.all<HoleLineRow>(sql.HOLE_LINES, sight).map((line) => this.withStack(line)),
      notices: notices.filter(({ sectionCodes }) => sectionCodes.includes(row.code)),
      metHere: this.reader.all<MetHereRow>(sql.MET_HERE, sight).map(presentMetHere),
    };
  }

  holeLine(actor: Actor, holeLineId: string): HoleLine {
    const row = this.reader.get<HoleLineRow>(sql.HOLE_LINE, { ...sightOf(actor), holeLineId });
    if (!row) throw new NotFound('hole line');
    return this.withStack(row);
  }

  findParts(actor: Actor, kitId: string, q: string): Part[] {
    const like = `%${q.replace(/[\\%_]/g, (sign) => `\\${sign}`)}%`;
    return this.reader.all<Part>(sql.FIND_PARTS, { ...sightOf(actor), kitId, like }).map(presentPart);
  }

  private summaries(actor: Actor, kitId: string, rows: SectionRow[]): SectionSummary[] {
    const sight = { ...sightOf(actor), kitId };
    type Tally = SectionSummary['questions'] & { sectionId: string };
    const tallies = new Map(
      this.reader.all<Tally>(sql.TALLY, sight).map(({ sectionId, ...tally }) => [sectionId, tally] as const),
    );
    const progress = this.progressOf(actor, kitId);
    return rows.map((row) =>
      presentSection(row, tallies.get(row.id) ?? NO_QUESTIONS, progress.get(row.id) ?? []),
    );
  }

  private progressOf(actor: Actor, kitId: string): Map<string, SectionSummary['progress']> {
    const build = this.reader.get<{ id: string }>(sql.OWN_BUILD, { kitId, userId: actor.id });
    const bySection = new Map<string, SectionSummary['progress']>();
    if (!build) return bySection;
    type Row = { sectionId: string; state: SectionSummary['progress'][number] };
    for (const { sectionId, state } of this.reader.all<Row>(sql.PROGRESS, { kitId, buildId: build.id }))
      bySection.set(sectionId, [...(bySection.get(sectionId) ?? []), state]);
    return bySection;
  }

  private withStack(row: HoleLineRow): HoleLine {
    const ids = JSON.parse(row.stack) as string[];
    const stack = ids.flatMap(
      (id) => this.reader.get<HoleLine['stack'][number]>(sql.PART_OF_STACK, [id]) ?? [],
    );
    return presentHoleLine(row, stack);
  }
}

function sightOf(actor: Actor) {
  return { chapters: JSON.stringify(activeChapterIds(actor)), keeper: actor.siteRole === null ? 0 : 1 };
}

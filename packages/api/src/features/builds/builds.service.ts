import { Injectable } from '@nestjs/common';
import {
  type Actor,
  type Build,
  type ClearOpenItem,
  type Entry,
  isChapterAdmin,
  type OpenItem,
  type Page,
  PAGE_USUAL,
  type Person,
  type StepStates,
} from '@rivetside/shared';
import { decodeCursor, pageOfRows } from '../../common/database/cursor.js';
import { PreparedReader } from '../../common/database/prepared-reader.js';
import { type Tx, UnitOfWork } from '../../common/database/unit-of-work.js';
import { authorize, BadInput, Conflict, NotFound } from '../../common/errors/app-error.js';
import { newId } from '../../common/ids.js';
import { Clock } from '../../common/time/clock.js';
import * as sql from './builds.sql.js';
import { EntryEntity } from './entry.entity.js';
import { OpenItemEntity } from './open-item.entity.js';

interface BuildRow {
  id: string;
  kitId: string;
  kitName: string;
  serial: number;
  chapterId: string;
  ownerId: string;
  ownerName: string;
  mentorId: string | null;
  mentorName: string | null;
  startedOn: string;
}
interface EntryRow extends Omit<Entry, 'lines' | 'helpers' | 'by'> {
  lines: string;
  helpers: string;
  byId: string;
  byName: string;
}
export type NewEntry = Omit<EntryEntity, 'id' | 'writtenAt'>;
export type NewOpenItem = Pick<OpenItemEntity, 'buildId' | 'sectionId' | 'questionId' | 'text' | 'due'>;

/** After every entry that can be: where a list begins. */
const NEWEST: readonly [string, string] = ['9999', '~'];

@Injectable()
export class BuildsService {
  constructor(
    private readonly reader: PreparedReader,
    private readonly unitOfWork: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  own(actor: Actor): Build[] {
    return this.reader
      .all<BuildRow>(sql.OWN_BUILDS, { userId: actor.id })
      .map((row) => this.present(actor, row));
  }

  /** Owner, crew, the build's mentor and the admin of its chapter; to others it is as if there were none. */
  requireById(actor: Actor, id: string): Build {
    const row = this.reader.get<BuildRow>(sql.BUILD, [id]);
    const build = row && this.present(actor, row);
    if (!build || !(build.mine || build.mentor?.id === actor.id || isChapterAdmin(actor, build.chapterId)))
      throw new NotFound('build');
    return build;
  }

  entries(
    actor: Actor,
    id: string,
    { limit = PAGE_USUAL, cursor }: { limit?: number; cursor?: string },
  ): Page<Entry> {
    this.requireById(actor, id);
    const [doneAt, entryId] = cursor ? decodeCursor(cursor) : NEWEST;
    const rows = this.reader.all<EntryRow>(sql.ENTRIES, [
      id,
      String(doneAt),
      String(entryId ?? ''),
      limit + 1,
    ]);
    return pageOfRows(rows, limit, presentEntry, (row) => [row.doneAt, row.id]);
  }

  openItems(actor: Actor, id: string): OpenItem[] {
    this.requireById(actor, id);
    return this.reader.all<OpenItem>(sql.OPEN_ITEMS, [id]);
  }

  async clear(actor: Actor, itemId: string, { note }: ClearOpenItem): Promise<OpenItem> {
    const known = this.reader.get<{ buildId: string; clearedAt: string | null }>(sql.OPEN_ITEM, [itemId]);
    if (!known) throw new NotFound('open item');
    const build = this.requireById(actor, known.buildId);
    authorize(build.mine, 'Only the builder and the crew clear an open item.');
    await this.unitOfWork.run(async (tx) => {
      const facts = { clearedAt: this.clock.instant(), clearedById: actor.id, clearedNote: note };
      const { affected } = await tx.manager
        .createQueryBuilder()
        .update(OpenItemEntity)
        .set(facts)
        .where({ id: itemId })
        .andWhere('"clearedAt" IS NULL')
        .execute();
      if (affected === 0) throw new Conflict('This item is cleared already.');
    });
    return this.reader.all<OpenItem>(sql.OPEN_ITEMS, [build.id]).find(({ id }) => id === itemId)!;
  }

  progress(actor: Actor, buildId: string, sectionId: string): StepStates {
    this.requireById(actor, buildId);
    return { steps: this.reader.all<StepStates['steps'][number]>(sql.STEP_STATES, [buildId, sectionId]) };
  }

  async setProgress(
    actor: Actor,
    buildId: string,
    sectionId: string,
    { steps }: StepStates,
  ): Promise<StepStates> {
    const build = this.requireById(actor, buildId);
    authorize(build.mine, 'Only the builder and the crew mark progress.');
    const known = new Set(this.progress(actor, buildId, sectionId).steps.map(({ stepId }) => stepId));
    const strange = steps.findIndex(({ stepId }) => !known.has(stepId));
    if (strange >= 0)
      throw new BadInput([{ path: `steps.${strange}.stepId`, message: 'This step is not in the section.' }]);
    await this.unitOfWork.runPrepared((db) => {
      for (const { stepId, state } of steps)
        db.run(sql.SET_STEP, [buildId, stepId, state, this.clock.instant()]);
    });
    return this.progress(actor, buildId, sectionId);
  }

  /** Owner and crew, for policies. */
  peopleOf(buildId: string): { ownerId: string; ids: string[] } | null {
    const row = this.reader.get<BuildRow>(sql.BUILD, [buildId]);
    if (!row) return null;
    const crew = this.reader.all<Person>(sql.CREW, [buildId]).map(({ id }) => id);
    return { ownerId: row.ownerId, ids: [row.ownerId, ...crew] };
  }

  async writeEntry(tx: Tx, entry: NewEntry): Promise<string> {
    const id = newId();
    await tx.manager.insert(EntryEntity, { ...entry, id, writtenAt: this.clock.instant() });
    return id;
  }

  async raiseOpenItem(tx: Tx, item: NewOpenItem): Promise<string> {
    const id = newId();
    const untouched = { clearedAt: null, clearedById: null, clearedNote: null };
    await tx.manager.insert(OpenItemEntity, { ...item, ...untouched, id, raisedAt: this.clock.instant() });
    return id;
  }

  private present(actor: Actor, row: BuildRow): Build {
    const { id, kitId, kitName, serial, chapterId, startedOn } = row;
    const crew = this.reader.all<Person>(sql.CREW, [id]);
    const owner = { id: row.ownerId, name: row.ownerName };
    const mentor = row.mentorId ? { id: row.mentorId, name: row.mentorName ?? '' } : null;
    const mine = [owner, ...crew].some((one) => one.id === actor.id);
    return { id, kitId, kitName, serial, chapterId, owner, crew, mentor, startedOn, mine };
  }
}

function presentEntry({ lines, helpers, byId, byName, ...row }: EntryRow): Entry {
  const by = { id: byId, name: byName };
  return { ...row, lines: JSON.parse(lines) as Entry['lines'], helpers: JSON.parse(helpers) as string[], by };
}

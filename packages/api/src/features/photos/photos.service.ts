import { createHash } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { Cron, CronExpression } from '@nestjs/schedule';
import type { Actor, DescribePhoto, Photo, PhotoSize } from '@rivetside/shared';
import { In } from 'typeorm';
import { PreparedReader } from '../../common/database/prepared-reader.js';
import { type Tx, UnitOfWork } from '../../common/database/unit-of-work.js';
import { BadInput, Conflict, NotFound } from '../../common/errors/app-error.js';
import { newId } from '../../common/ids.js';
import { Clock } from '../../common/time/clock.js';
import { develop } from './develop.js';
import { PhotoStore } from './photo-store.js';
import { type PhotoRow, PhotoUrlsService } from './photo-urls.service.js';
import { PhotoUseEntity } from './photo-use.entity.js';
import { PhotoEntity } from './photo.entity.js';
import { ON_QUESTION, ONE, UNUSED } from './photos.sql.js';

const DAY_MS = 86_400_000;

export interface Attachment {
  readonly photoIds: readonly string[];
  readonly ownerId: string;
  readonly questionId: string;
  /** `question`, or the id of the event or completion that brings them. */
  readonly usedIn: string;
}

@Injectable()
export class PhotosService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly reader: PreparedReader,
    private readonly store: PhotoStore,
    private readonly urls: PhotoUrlsService,
    private readonly clock: Clock,
  ) {}

  /** Developed and stored before the row is written: a broken-off upload leaves nothing that anybody sees. */
  async keep(actor: Pick<Actor, 'id'>, bytes: Buffer, caption: string | null = null): Promise<Photo> {
    const id = newId();
    const { width, height, files } = await develop(bytes);
    for (const [size, file] of Object.entries(files)) await this.store.put(id, size as PhotoSize, file);
    const sha256 = createHash('sha256').update(files.full).digest('hex');
    const facts = {
      id,
      ownerId: actor.id,
      contentType: 'image/jpeg',
      width,
      height,
      bytes: files.full.length,
    };
    await this.unitOfWork.run((tx) =>
      tx.manager.insert(PhotoEntity, {
        ...facts,
        sha256,
        caption,
        marks: [],
        storedAt: this.clock.instant(),
      }),
    );
    return this.urls.present({ ...facts, caption, marks: '[]' });
  }

  async describe(actor: Actor, id: string, { caption }: DescribePhoto): Promise<Photo> {
    this.requireOwn(actor, id);
    await this.unitOfWork.run((tx) => tx.manager.update(PhotoEntity, { id }, { caption }));
    return this.urls.present(this.requireOwn(actor, id));
  }

  /** Only what hangs nowhere yet: what others have seen stays. */
  async discard(actor: Actor, id: string): Promise<void> {
    this.requireOwn(actor, id);
    await this.unitOfWork.run(async (tx) => {
      if (await tx.manager.existsBy(PhotoUseEntity, { photoId: id }))
        throw new Conflict('This photo is part of a question: it stays.');
      await tx.manager.delete(PhotoEntity, { id });
    });
    await this.store.remove(id);
  }

  read(id: string, size: PhotoSize): Promise<Buffer | null> {
    return this.store.get(id, size);
  }

  /** Hangs photos on a question, in the unit that writes what they belong to. */
  async attach(tx: Tx, { photoIds, ownerId, questionId, usedIn }: Attachment): Promise<void> {
    if (photoIds.length === 0) return;
    const ids = [...photoIds];
    const own = await tx.manager.countBy(PhotoEntity, { id: In(ids), ownerId });
    const used = await tx.manager.countBy(PhotoUseEntity, { photoId: In(ids) });
    if (own !== ids.length || used > 0)
      throw new BadInput([{ path: 'photoIds', message: 'Name your own photos, each in one place only.' }]);
    await tx.manager.insert(
      PhotoUseEntity,
      ids.map((photoId, position) => ({ photoId, questionId, usedIn, position })),
    );
  }

  /** All photos of a question, by what they came with. */
  ofQuestion(questionId: string): Map<string, Photo[]> {
    const byUse = new Map<string, Photo[]>();
    for (const { usedIn, ...row } of this.reader.all<PhotoRow & { usedIn: string }>(ON_QUESTION, [
      questionId,
    ])) {
      const list = byUse.get(usedIn);
      if (list) list.push(this.urls.present(row));
      else byUse.set(usedIn, [this.urls.present(row)]);
    }
    return byUse;
  }

  /** Photos that were uploaded and then never sent along. */
  @Cron(CronExpression.EVERY_6_HOURS)
  async sweepUnused(): Promise<void> {
    const before = new Date(this.clock.now().getTime() - DAY_MS).toISOString();
    for (const { id } of this.reader.all<{ id: string }>(UNUSED, [before])) {
      await this.unitOfWork.run((tx) => tx.manager.delete(PhotoEntity, { id }));
      await this.store.remove(id);
    }
  }

  private requireOwn(actor: Actor, id: string): PhotoRow {
    const row = this.reader.get<PhotoRow & { ownerId: string }>(ONE, [id]);
    if (row?.ownerId !== actor.id) throw new NotFound('photo');
    return row;
  }
}

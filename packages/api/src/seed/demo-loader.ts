import { Injectable, Logger } from '@nestjs/common';
import { ModuleRef } from '@nestjs/core';
import { PreparedReader } from '../common/database/prepared-reader.js';
import { type Tx, UnitOfWork } from '../common/database/unit-of-work.js';
import { Passwords } from '../features/accounts/passwords.js';
import { DEMO_PASSWORD } from '../features/demo/demo.service.js';
import { StampExpiryJob } from '../features/endorsements/stamp-expiry.job.js';
import { PhotoStore } from '../features/photos/photo-store.js';
import { QuestionLogService } from '../features/questions/question-log.service.js';
import { SearchIndexService } from '../features/search/search-index.service.js';
import { loadKit } from './load-kit.js';
import { atNoon, loadBuilds, loadOpenItems, loadPeople } from './load-people.js';
import { storePhotos } from './load-photos.js';
import { loadQuestions } from './load-questions.js';
import { readSeedWorld, STORY_ENDS_ON } from './seed-world.js';
import { SeedKeys } from './seed-keys.js';
import { StoryClock } from './story-clock.js';

const ANYBODY = 'SELECT 1 AS "yes" FROM "users" LIMIT 1';

/** Loads the demo world into an empty database: all of it or nothing. */
@Injectable()
export class DemoLoader {
  private readonly logger = new Logger(DemoLoader.name);

  constructor(
    private readonly reader: PreparedReader,
    private readonly unitOfWork: UnitOfWork,
    private readonly passwords: Passwords,
    private readonly store: PhotoStore,
    private readonly index: SearchIndexService,
    private readonly modules: ModuleRef,
  ) {}

  async loadIntoEmpty(): Promise<void> {
    if (this.reader.get(ANYBODY)) return;
    const world = readSeedWorld();
    // What takes long waits outside of the unit: a hash, and pictures.
    const [passwordHash, photos] = await Promise.all([
      this.passwords.hash(DEMO_PASSWORD),
      storePhotos(world, this.store),
    ]);
    const clock = new StoryClock();
    const log = new QuestionLogService(clock);
    await this.unitOfWork.run(async ({ manager }) => {
      // Nobody watches yet, and nothing of it happens now.
      const tx: Tx = { manager, record: () => undefined };
      const loading = { tx, world, keys: new SeedKeys(), index: this.index };
      await loadPeople(loading, passwordHash);
      await loadKit(loading);
      await loadBuilds(loading);
      await loadQuestions({ ...loading, clock, log, photos });
      await loadOpenItems(loading);
      clock.standAt(atNoon(STORY_ENDS_ON));
      for (const { key } of world.questions) await log.restate(tx, loading.keys.of('question', key));
    });
    // Its own start found nothing yet; a stop before it ends is made good by the next start.
    await this.modules.get(StampExpiryJob, { strict: false }).expire();
    this.logger.log({ questions: world.questions.length, photos: photos.size }, 'the demo world is loaded');
  }
}

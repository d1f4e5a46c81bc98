import { AccountsModule } from './accounts/accounts.module.js';
import { BuildsModule } from './builds/builds.module.js';
import { ChaptersModule } from './chapters/chapters.module.js';
import { DemoModule } from './demo/demo.module.js';
import { EndorsementsModule } from './endorsements/endorsements.module.js';
import { FitChecksModule } from './fit-checks/fit-checks.module.js';
import { FixesModule } from './fixes/fixes.module.js';
import { KitsModule } from './kits/kits.module.js';
import { NoticesModule } from './notices/notices.module.js';
import { PhotosModule } from './photos/photos.module.js';
import { QuestionsModule } from './questions/questions.module.js';
import { SearchModule } from './search/search.module.js';

/** Every feature of the app. */
export const features = [
  AccountsModule,
  BuildsModule,
  ChaptersModule,
  DemoModule,
  EndorsementsModule,
  FitChecksModule,
  FixesModule,
  KitsModule,
  NoticesModule,
  PhotosModule,
  QuestionsModule,
  SearchModule,
];

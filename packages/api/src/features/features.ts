import { AccountsModule } from './accounts/accounts.module.js';
import { BuildsModule } from './builds/builds.module.js';
import { ChaptersModule } from './chapters/chapters.module.js';
import { DemoModule } from './demo/demo.module.js';
import { KitsModule } from './kits/kits.module.js';
import { NoticesModule } from './notices/notices.module.js';
import { PhotosModule } from './photos/photos.module.js';
import { SearchModule } from './search/search.module.js';

/** Every feature of the app. */
export const features = [
  AccountsModule,
  BuildsModule,
  ChaptersModule,
  DemoModule,
  KitsModule,
  NoticesModule,
  PhotosModule,
  SearchModule,
];

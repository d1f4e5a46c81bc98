import { AccountsModule } from './accounts/accounts.module.js';
import { ChaptersModule } from './chapters/chapters.module.js';

/** Every feature of the app. */
export const features = [AccountsModule, ChaptersModule];

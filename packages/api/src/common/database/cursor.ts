import { z } from 'zod';
import { BadInput } from '../errors/app-error.js';

const keySchema = z
  .array(z.union([z.string(), z.number()]))
  .min(1)
  .max(6);

/** Where a page ended: the sort key of its last row. Opaque to others. */
export function encodeCursor(key: readonly (string | number)[]): string {
  return Buffer.from(JSON.stringify(key)).toString('base64url');
}

export function decodeCursor(cursor: string): (string | number)[] {
  try {
    return keySchema.parse(JSON.parse(Buffer.from(cursor, 'base64url').toString('utf8')));
  } catch {
    throw new BadInput([
      { path: 'cursor', message: 'This cursor was not made here: start again without one.' },
    ]);
  }
}

/** Cuts a page from rows fetched with one more than asked for. */
export function pageOfRows<Row, Item>(
  rows: readonly Row[],
  limit: number,
  present: (row: Row) => Item,
  keyOf: (row: Row) => readonly (string | number)[],
): { items: Item[]; nextCursor: string | null } {
  const shown = rows.slice(0, limit);
  const last = shown.at(-1);
  return {
    items: shown.map(present),
    nextCursor: rows.length > limit && last !== undefined ? encodeCursor(keyOf(last)) : null,
  };
}

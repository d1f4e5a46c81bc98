import type { Times } from '../../lib/times';

const BEFORE_OPERATION = / (?=Op \d+ )/g;
const DAY = /\b\d{4}-\d\d-\d\d\b/g;

/** A line as it was written, with each operation on a line of its own and its days as the reader writes them. */
export function lineWords(text: string, { date }: Pick<Times, 'date'>): string {
  return text.replace(BEFORE_OPERATION, '\n').replace(DAY, (day) => date(day));
}

import { questionQuerySchema } from '@rivetside/shared';
import type { QuestionFilter } from './queries';

/** In the order in which the address shows them. */
const NAMES = [
  'q',
  'state',
  'discipline',
  'kitId',
  'sectionId',
  'partId',
  'holeLineId',
  'chapterId',
  'mine',
  'sort',
] as const satisfies readonly (keyof QuestionFilter)[];

/** Reads the filters an address holds. One that cannot be meant, as of an old or mistyped link, is left out. */
export function filterOfAddress(search: URLSearchParams): QuestionFilter {
  const told = NAMES.flatMap((name) => {
    const value = search.get(name);
    const read = questionQuerySchema.shape[name].safeParse(value ?? undefined);
    return value !== null && read.success && read.data !== undefined ? [[name, read.data] as const] : [];
  });
  return Object.fromEntries(told);
}

/** The address for those filters; what narrows nothing is not in it. */
export function addressOfFilter(filter: QuestionFilter): URLSearchParams {
  const isUsual = (name: string, value: string) =>
    (name === 'mine' && value === 'false') || (name === 'sort' && value === 'activity');
  const told = NAMES.flatMap((name) => {
    const value = filter[name];
    return value === undefined || isUsual(name, value) ? [] : [[name, value]];
  });
  return new URLSearchParams(told);
}

/** How many of them narrow the list; the order does not. */
export function narrowings(filter: QuestionFilter): number {
  return [...addressOfFilter(filter).keys()].filter((name) => name !== 'sort').length;
}

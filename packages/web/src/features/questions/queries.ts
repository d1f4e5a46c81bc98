import { pageOf, type QuestionQuery, questionRowSchema } from '@rivetside/shared';
import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query';
import { api, queryString } from '../../lib/api';

/** What a list may be narrowed by; paging is not part of it. */
export type QuestionFilter = Omit<QuestionQuery, 'limit' | 'cursor'>;

export const questionKeys = {
  /** Every list of questions, whatever it is narrowed by: an event tells only that one of them changed. */
  lists: ['questions', 'list'] as const,
};
const rows = pageOf(questionRowSchema);

/** The list page by page, as far as the reader has asked for more. */
export const questionPages = (filter: QuestionFilter) =>
  infiniteQueryOptions({
    queryKey: [...questionKeys.lists, 'pages', filter] as const,
    queryFn: ({ pageParam: cursor, signal }) =>
      api.get(`/questions${queryString({ ...filter, cursor })}`, { answer: rows, signal }),
    initialPageParam: undefined as string | undefined,
    getNextPageParam: ({ nextCursor }) => nextCursor ?? undefined,
  });

/** The first few rows, where a page shows them beside other things. */
export const firstQuestions = (filter: QuestionFilter, limit: number) =>
  queryOptions({
    queryKey: [...questionKeys.lists, 'first', limit, filter] as const,
    queryFn: ({ signal }) =>
      api.get(`/questions${queryString({ ...filter, limit })}`, { answer: rows, signal }),
  });

import { pageOf, searchHitSchema } from '@rivetside/shared';
import { infiniteQueryOptions } from '@tanstack/react-query';
import { api, queryString } from '../../lib/api';

const hits = pageOf(searchHitSchema);

export const searchPages = (q: string) =>
  infiniteQueryOptions({
    queryKey: ['search', q] as const,
    queryFn: ({ pageParam: cursor, signal }) =>
      api.get(`/search${queryString({ q, cursor })}`, { answer: hits, signal }),
    initialPageParam: undefined as string | undefined,
    getNextPageParam: ({ nextCursor }) => nextCursor ?? undefined,
    enabled: q !== '',
  });

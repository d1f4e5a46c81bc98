import { type ClearOpenItem, entrySchema, type OpenItem, openItemSchema, pageOf } from '@rivetside/shared';
import { infiniteQueryOptions, queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { api, queryString } from '../../lib/api';

export const recordKeys = {
  /** Below the builds: carrying out a fix writes here. */
  all: ['builds', 'record'] as const,
  ofBuild: (buildId: string) => [...recordKeys.all, buildId] as const,
};
const entries = pageOf(entrySchema);
const openItems = pageOf(openItemSchema);

export const entryPages = (buildId: string) =>
  infiniteQueryOptions({
    queryKey: [...recordKeys.ofBuild(buildId), 'entries'] as const,
    queryFn: ({ pageParam: cursor, signal }) =>
      api.get(`/builds/${buildId}/entries${queryString({ cursor })}`, { answer: entries, signal }),
    initialPageParam: undefined as string | undefined,
    getNextPageParam: ({ nextCursor }) => nextCursor ?? undefined,
  });

export const buildOpenItems = (buildId: string) =>
  queryOptions({
    queryKey: [...recordKeys.ofBuild(buildId), 'open-items'] as const,
    queryFn: ({ signal }) => api.get(`/builds/${buildId}/open-items`, { answer: openItems, signal }),
  });

export function useClearOpenItem(item: OpenItem) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (body: ClearOpenItem) =>
      api.post(`/open-items/${item.id}/clearance`, { body, answer: openItemSchema }),
    onSuccess: () => queryClient.invalidateQueries({ queryKey: recordKeys.ofBuild(item.buildId) }),
  });
}

import { chapterMemberSchema, chapterSchema, pageOf } from '@rivetside/shared';
import { queryOptions } from '@tanstack/react-query';
import { api } from '../../lib/api';

const chapters = pageOf(chapterSchema);
const members = pageOf(chapterMemberSchema);

export const chapterList = queryOptions({
  queryKey: ['chapters'] as const,
  queryFn: ({ signal }) => api.get('/chapters?limit=100', { answer: chapters, signal }),
  staleTime: 5 * 60_000,
});

export const chapterMembers = (chapterId: string) =>
  queryOptions({
    queryKey: ['chapters', chapterId, 'members'] as const,
    queryFn: ({ signal }) => api.get(`/chapters/${chapterId}/members?limit=100`, { answer: members, signal }),
  });

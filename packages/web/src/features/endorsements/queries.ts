import {
  chapterMemberSchema,
  type Endorse,
  endorsementSchema,
  pageOf,
  type ReasonBody,
  type ReviewStamp,
} from '@rivetside/shared';
import { queryOptions } from '@tanstack/react-query';
import { api, queryString } from '../../lib/api';

export const stampWire = {
  endorse: (fixId: string, body: Endorse, key: string) =>
    api.post(`/fixes/${fixId}/endorsements`, { body, key, answer: endorsementSchema }),
  withdraw: (id: string, body: ReasonBody, key: string) =>
    api.post(`/endorsements/${id}/withdrawal`, { body, key, answer: endorsementSchema }),
  review: (id: string, body: ReviewStamp, key: string) =>
    api.post(`/endorsements/${id}/review`, { body, key, answer: endorsementSchema }),
};

/** Who is in a chapter, with their stamp numbers. */
export const chapterMembers = (chapterId: string) =>
  queryOptions({
    queryKey: ['chapters', chapterId, 'members'] as const,
    queryFn: ({ signal }) =>
      api.get(`/chapters/${chapterId}/members${queryString({ limit: 100 })}`, {
        answer: pageOf(chapterMemberSchema),
        signal,
      }),
    staleTime: 5 * 60_000,
  });

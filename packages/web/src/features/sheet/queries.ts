import {
  eventsAnswerSchema,
  pageOf,
  type Question,
  questionSchema,
  type ReasonBody,
  type Refer,
  type ReferralAnswer,
  similarQuestionSchema,
} from '@rivetside/shared';
import { queryOptions } from '@tanstack/react-query';
import { api, queryString } from '../../lib/api';
import { hasEarlierEvents, withEarlierEvents } from './sheet-events';

export const sheetKeys = {
  one: (id: string) => ['questions', 'sheet', id] as const,
  similar: (id: string) => ['questions', 'similar-to', id] as const,
};

/** Events may have arrived while it was read: what is known and newer stays, and so does the talk before it. */
function newest(known: unknown, read: unknown): unknown {
  const [before, after] = [known as Question | undefined, read as Question];
  if (!before || before.id !== after.id) return after;
  if (before.lastSeq > after.lastSeq) return before;
  return hasEarlierEvents(after) ? withEarlierEvents(after, before.events) : after;
}

export const questionSheet = (id: string) =>
  queryOptions({
    queryKey: sheetKeys.one(id),
    queryFn: ({ signal }) => api.get(`/questions/${id}`, { answer: questionSchema, signal }),
    structuralSharing: newest,
  });

export const similarTo = (id: string) =>
  queryOptions({
    queryKey: sheetKeys.similar(id),
    queryFn: ({ signal }) =>
      api.get(`/questions/similar${queryString({ questionId: id })}`, {
        answer: pageOf(similarQuestionSchema),
        signal,
      }),
    staleTime: 5 * 60_000,
  });

export const sheetWire = {
  eventsAfter: (id: string, after: number) =>
    api.get(`/questions/${id}/events${queryString({ after })}`, { answer: eventsAnswerSchema }),
  eventsBefore: (id: string, before: number) =>
    api.get(`/questions/${id}/events${queryString({ before, limit: 50 })}`, { answer: eventsAnswerSchema }),
  see: (id: string, seq: number) => api.put(`/questions/${id}/seen`, { body: { seq } }),
  withdraw: (id: string, body: ReasonBody, key: string) =>
    api.post(`/questions/${id}/withdrawal`, { body, key, answer: questionSchema }),
  refer: (id: string, body: Refer, key: string) =>
    api.post(`/questions/${id}/referral`, { body, key, answer: questionSchema }),
  answerReferral: (id: string, body: ReferralAnswer, key: string) =>
    api.post(`/questions/${id}/referral/answer`, { body, key, answer: questionSchema }),
};

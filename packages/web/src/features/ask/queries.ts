import {
  buildSchema,
  kitSchema,
  pageOf,
  partSchema,
  questionSchema,
  sectionSchema,
  sectionSummarySchema,
  similarQuestionSchema,
  type AskQuestion,
  type SimilarQuery,
} from '@rivetside/shared';
import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { api, queryString } from '../../lib/api';

/** Below the prefixes that any write makes stale; the last word keeps them apart from what other pages read there. */
const askKeys = {
  kits: ['kits', 'to-ask'] as const,
  sections: (kitId: string) => ['sections', 'to-ask', kitId] as const,
  section: (id: string) => ['sections', id, 'to-ask'] as const,
  parts: (kitId: string, words: string) => ['parts', kitId, words] as const,
  builds: ['builds', 'to-ask'] as const,
  similar: (query: SimilarQuery) => ['questions', 'similar', query] as const,
};

const KIT_STANDS_MS = 5 * 60_000;

export const kitsToAsk = queryOptions({
  queryKey: askKeys.kits,
  queryFn: ({ signal }) => api.get('/kits', { answer: pageOf(kitSchema), signal }),
  staleTime: KIT_STANDS_MS,
});

export const buildsOfAsker = queryOptions({
  queryKey: askKeys.builds,
  queryFn: ({ signal }) => api.get('/builds', { answer: pageOf(buildSchema), signal }),
  staleTime: KIT_STANDS_MS,
});

export const sectionsToAsk = (kitId: string | null) =>
  queryOptions({
    queryKey: askKeys.sections(kitId ?? ''),
    queryFn: ({ signal }) =>
      api.get(`/kits/${kitId}/sections`, { answer: pageOf(sectionSummarySchema), signal }),
    enabled: kitId !== null,
    staleTime: KIT_STANDS_MS,
  });

export const sectionToAsk = (id: string | null) =>
  queryOptions({
    queryKey: askKeys.section(id ?? ''),
    queryFn: ({ signal }) => api.get(`/sections/${id}`, { answer: sectionSchema, signal }),
    enabled: id !== null,
    staleTime: KIT_STANDS_MS,
  });

export const partsFound = (kitId: string | null, words: string) =>
  queryOptions({
    queryKey: askKeys.parts(kitId ?? '', words),
    queryFn: ({ signal }) =>
      api.get(`/parts${queryString({ kitId, q: words })}`, { answer: pageOf(partSchema), signal }),
    enabled: kitId !== null && words !== '',
    staleTime: KIT_STANDS_MS,
  });

/** Nothing is looked for while there is nothing to be alike. What was found stays until there is an answer to the rest. */
export const metBefore = (query: SimilarQuery | null) =>
  queryOptions({
    queryKey: askKeys.similar(query ?? {}),
    queryFn: ({ signal }) =>
      api.post('/questions/similar', { body: query, answer: pageOf(similarQuestionSchema), signal }),
    enabled: query !== null,
    placeholderData: keepPreviousData,
  });

export function askQuestion(body: AskQuestion, key: string) {
  return api.post('/questions', { body, key, answer: questionSchema });
}

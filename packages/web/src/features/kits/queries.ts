import { kitSchema, noticeSchema, pageOf, sectionSchema, sectionSummarySchema } from '@rivetside/shared';
import { queryOptions } from '@tanstack/react-query';
import { api, queryString } from '../../lib/api';

/** Below `kits` and `sections`: what is asked or answered there changes their tallies. */
export const kitKeys = {
  all: ['kits'] as const,
  sections: ['sections'] as const,
};

export const kitList = queryOptions({
  queryKey: [...kitKeys.all, 'list'] as const,
  queryFn: ({ signal }) => api.get('/kits', { answer: pageOf(kitSchema), signal }),
});

export const kitSections = (kitId: string) =>
  queryOptions({
    queryKey: [...kitKeys.all, kitId, 'sections'] as const,
    queryFn: ({ signal }) =>
      api.get(`/kits/${kitId}/sections`, { answer: pageOf(sectionSummarySchema), signal }),
  });

export const kitNotices = (kitId: string) =>
  queryOptions({
    queryKey: [...kitKeys.all, kitId, 'notices'] as const,
    queryFn: ({ signal }) =>
      api.get(`/notices${queryString({ kitId })}`, { answer: pageOf(noticeSchema), signal }),
  });

export const sectionById = (id: string) =>
  queryOptions({
    queryKey: [...kitKeys.sections, id] as const,
    queryFn: ({ signal }) => api.get(`/sections/${id}`, { answer: sectionSchema, signal }),
  });

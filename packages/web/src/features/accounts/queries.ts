import { demoSignInSchema, pageOf, sessionSchema } from '@rivetside/shared';
import { queryOptions } from '@tanstack/react-query';
import { z } from 'zod';
import { api, Problem } from '../../lib/api';

/** Nobody outside a demo: there the address does not exist. */
export const demoSignIns = queryOptions({
  queryKey: ['demo'] as const,
  queryFn: ({ signal }) =>
    api.get('/demo', { answer: z.array(demoSignInSchema), signal }).catch((error: unknown) => {
      if (error instanceof Problem && error.status === 404) return [];
      throw error;
    }),
  staleTime: Infinity,
  retry: false,
});

export const ownSessions = queryOptions({
  queryKey: ['me', 'sessions'] as const,
  queryFn: ({ signal }) => api.get('/me/sessions?limit=100', { answer: pageOf(sessionSchema), signal }),
});

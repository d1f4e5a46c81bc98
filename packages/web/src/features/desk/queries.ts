import { deskSchema } from '@rivetside/shared';
import { queryOptions } from '@tanstack/react-query';
import { api } from '../../lib/api';

export const deskQuery = queryOptions({
  // Below the questions: whatever makes them stale makes the desk stale.
  queryKey: ['questions', 'desk'] as const,
  queryFn: ({ signal }) => api.get('/desk', { answer: deskSchema, signal }),
});

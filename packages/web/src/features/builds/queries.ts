import { buildSchema, pageOf, type StepStates, stepStatesSchema } from '@rivetside/shared';
import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { api } from '../../lib/api';

export const buildKeys = {
  all: ['builds'] as const,
  progress: (buildId: string, sectionId: string) =>
    [...buildKeys.all, buildId, 'progress', sectionId] as const,
};

/** Those that the reader owns or helps on. */
export const ownBuilds = queryOptions({
  queryKey: [...buildKeys.all, 'own'] as const,
  queryFn: ({ signal }) => api.get('/builds', { answer: pageOf(buildSchema), signal }),
});

const addressOf = (buildId: string, sectionId: string) => `/builds/${buildId}/sections/${sectionId}/progress`;

export const sectionProgress = (buildId: string, sectionId: string) =>
  queryOptions({
    queryKey: buildKeys.progress(buildId, sectionId),
    queryFn: ({ signal }) => api.get(addressOf(buildId, sectionId), { answer: stepStatesSchema, signal }),
  });

/** Shown as set at once; what the server refuses goes back to how it was. */
export function useSetProgress(buildId: string, sectionId: string) {
  const queryClient = useQueryClient();
  const queryKey = buildKeys.progress(buildId, sectionId);
  return useMutation({
    mutationFn: (body: StepStates) =>
      api.put(addressOf(buildId, sectionId), { answer: stepStatesSchema, body }),
    onMutate: async ({ steps }) => {
      await queryClient.cancelQueries({ queryKey });
      const before = queryClient.getQueryData<StepStates>(queryKey);
      const states = new Map(steps.map(({ stepId, state }) => [stepId, state]));
      queryClient.setQueryData<StepStates>(
        queryKey,
        (known) =>
          known && {
            steps: known.steps.map((step) => ({ ...step, state: states.get(step.stepId) ?? step.state })),
          },
      );
      return { before };
    },
    onError: (_error, _steps, context) => queryClient.setQueryData(queryKey, context?.before),
    onSettled: () =>
      Promise.all([
        queryClient.invalidateQueries({ queryKey }),
        queryClient.invalidateQueries({ queryKey: ['kits'] }),
        queryClient.invalidateQueries({ queryKey: ['sections'] }),
      ]),
  });
}

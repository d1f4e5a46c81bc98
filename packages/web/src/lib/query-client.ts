import { QueryClient } from '@tanstack/react-query';
import { Problem } from './problem';

const isPassing = (error: unknown) => error instanceof Problem && (error.isOffline || error.status >= 500);

export function createQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      // 'always': a paused query looks like one that takes for ever; a page has to say that there is no network.
      queries: {
        staleTime: 20_000,
        networkMode: 'always',
        retry: (count, error) => count < 1 && isPassing(error),
      },
      mutations: { networkMode: 'always', retry: false },
    },
  });
}

export const queryClient = createQueryClient();

import { MantineProvider } from '@mantine/core';
import { QueryClientProvider, type QueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import { RouterProvider, type createBrowserRouter } from 'react-router-dom';
import { session } from '../lib/session';
import { cspNonce } from './csp-nonce';
import { colorSchemeManager, theme } from './theme';

interface AppProps {
  readonly router: ReturnType<typeof createBrowserRouter>;
  readonly queryClient: QueryClient;
  readonly env?: 'default' | 'test';
}

export function App({ router, queryClient, env = 'default' }: AppProps) {
  useForgetAtSignOut(queryClient);
  return (
    <MantineProvider
      theme={theme}
      defaultColorScheme="auto"
      colorSchemeManager={colorSchemeManager}
      getStyleNonce={cspNonce}
      env={env}
    >
      <QueryClientProvider client={queryClient}>
        <RouterProvider router={router} />
      </QueryClientProvider>
    </MantineProvider>
  );
}

/** Whatever one person was shown is gone before the next one sits down at the same machine. */
function useForgetAtSignOut(queryClient: QueryClient): void {
  useEffect(() => {
    let last = session.me()?.id;
    return session.onChange(() => {
      const now = session.me()?.id;
      if (last !== undefined && now !== last) queryClient.clear();
      last = now;
    });
  }, [queryClient]);
}

import '@fontsource/lato/latin-400.css';
import '@fontsource/lato/latin-700.css';
import '@fontsource/lato/latin-900.css';
import '@fontsource/ibm-plex-mono/latin-400.css';
import '@fontsource/ibm-plex-mono/latin-600.css';
import '@mantine/core/styles/default-css-variables.css';
import './theme.css';
import { setNonce } from 'get-nonce';
import { createRoot } from 'react-dom/client';
import { createBrowserRouter } from 'react-router-dom';
import { queryClient } from '../lib/query-client';
import { session } from '../lib/session';
import { App } from './app';
import { cspNonce } from './csp-nonce';
import { createRoutes } from './router';

type Router = ReturnType<typeof createBrowserRouter>;

/** The welcome is painted by index.html: it stands until the page that says the same is there to take its place. */
function whenReady(router: Router): Promise<void> {
  const isPainted = document.documentElement.hasAttribute('data-welcome');
  if (!isPainted || router.state.initialized) return Promise.resolve();
  return new Promise((resolve) => {
    const stop = router.subscribe(({ initialized }) => {
      if (!initialized) return;
      stop();
      resolve();
    });
  });
}

async function begin(): Promise<void> {
  const router = createBrowserRouter(createRoutes(queryClient));
  await whenReady(router);
  createRoot(document.getElementById('root')!).render(<App router={router} queryClient={queryClient} />);
}

/** Wanted when there is no network, so they are fetched while there is one and nothing else is going on. */
async function fetchForLater(): Promise<void> {
  await import('../routes/stop');
  if (session.me()) await import('../routes/ask');
}

// The scroll lock of dialogs writes a style element of its own.
setNonce(cspNonce());
// Asked for while the page's own script is still on its way; whoever opens a page waits for the same answer.
void session.start().catch(() => undefined);
void begin();
window.addEventListener('load', () => setTimeout(() => void fetchForLater().catch(() => undefined), 2_000), {
  once: true,
});

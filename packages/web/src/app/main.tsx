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
import { createRoutes } from './router';
import { cspNonce } from './csp-nonce';

// The scroll lock of dialogs writes a style element of its own.
setNonce(cspNonce());
// Asked for while the page's own script is still on its way; whoever opens a page waits for the same answer.
void session.start().catch(() => undefined);

createRoot(document.getElementById('root')!).render(
  <App router={createBrowserRouter(createRoutes(queryClient))} queryClient={queryClient} />,
);

/** Wanted when there is no network, so it is fetched while there is one and nothing else is going on. */
const readStopPage = () => void import('../routes/stop').catch(() => undefined);
window.addEventListener('load', () => setTimeout(readStopPage, 2_000), { once: true });

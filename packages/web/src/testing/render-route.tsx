import type { Me } from '@rivetside/shared';
import { render } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { createMemoryRouter } from 'react-router-dom';
import { App } from '../app/app';
import { createRoutes } from '../app/router';
import { createQueryClient } from '../lib/query-client';
import { access } from '../lib/access';
import { session } from '../lib/session';
import { makeMe } from './make-me';

interface Opening {
  /** Who is signed in; null for a stranger. */
  readonly me?: Me | null;
  readonly units?: Me['units'];
}

/** Signs somebody in without a word to the server. */
export function signedInAs(me: Me): void {
  access.take({ accessToken: 'token-of-the-test', expiresIn: 900, user: me });
  session.changed(me);
}

/** Opens the real routes at an address. */
export function renderRoute(address: string, { me = makeMe(), units = 'inch' }: Opening = {}) {
  if (me) signedInAs({ ...me, units });
  const queryClient = createQueryClient();
  queryClient.setDefaultOptions({ queries: { retry: false } });
  const router = createMemoryRouter(createRoutes(queryClient), { initialEntries: [address] });
  const view = render(<App router={router} queryClient={queryClient} env="test" />);
  return { ...view, user: userEvent.setup(), router, queryClient };
}

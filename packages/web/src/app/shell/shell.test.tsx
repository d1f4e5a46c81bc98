import type { Me } from '@rivetside/shared';
import { act, screen, waitFor, within } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { api } from '../../lib/api';
import { session } from '../../lib/session';
import { makeMe } from '../../testing/make-me';
import { renderRoute } from '../../testing/render-route';
import { server } from '../../testing/server';

const build = {
  id: 'b1',
  kitId: 'k1',
  kitName: 'Fellwisp Two',
  serial: 141,
  chapterId: 'c1',
  owner: { id: 'p1', name: 'Ottoline Brackwater' },
  crew: [],
  mentor: null,
  startedOn: '2024-02-01',
  mine: true,
};
const problem = (status: number, title: string) =>
  HttpResponse.json({ title, status }, { status, headers: { 'content-type': 'application/problem+json' } });

function withBuilds(...items: object[]): void {
  server.use(http.get('*/api/builds', () => HttpResponse.json({ items, nextCursor: null })));
}
const places = async () =>
  within((await screen.findAllByRole('navigation', { name: 'Places' }))[0]!)
    .getAllByRole('link')
    .map((link) => link.textContent)
    .filter(Boolean);

function setOnline(isOnline: boolean): void {
  jest.spyOn(navigator, 'onLine', 'get').mockReturnValue(isOnline);
  act(() => void window.dispatchEvent(new Event(isOnline ? 'online' : 'offline')));
}

afterEach(() => jest.restoreAllMocks());

it('lists the record only for whoever has a build', async () => {
  withBuilds();
  renderRoute('/stop');
  expect(await places()).toEqual(['Bench', 'Kit', 'Questions']);
});

it('lists the record with a build, and marks the place one is at', async () => {
  withBuilds(build);
  renderRoute('/stop');
  await waitFor(async () => expect(await places()).toEqual(['Bench', 'Kit', 'Questions', 'Record']));
});

it('shows a stranger no places, but the way in and the stop page', async () => {
  renderRoute('/', { me: null });
  const nav = await screen.findByRole('navigation', { name: 'Places' });
  expect(
    within(nav)
      .getAllByRole('link')
      .map((link) => link.textContent),
  ).toEqual(['Something is wrong', 'Sign in']);
});

it('asks a stranger to sign in first, and remembers where they were going', async () => {
  server.use(http.get('*/api/demo', () => problem(404, 'Not found')));
  const { router } = renderRoute('/account?from=mail', { me: null });
  expect(await screen.findByRole('heading', { name: 'Sign in' })).toBeInTheDocument();
  expect(router.state.location.search).toBe(`?next=${encodeURIComponent('/account?from=mail')}`);
});

it('says on an unknown address what to do', async () => {
  withBuilds();
  renderRoute('/nowhere');
  expect(await screen.findByRole('alert')).toHaveTextContent('There is nothing at this address.');
});

it('goes where is asked with what was typed into the field', async () => {
  withBuilds();
  const { user, router } = renderRoute('/stop');
  await user.type((await screen.findAllByRole('searchbox', { name: 'Find' }))[0]!, 'edge 0.25 AD3{Enter}');
  await waitFor(() => expect(router.state.location.pathname).toBe('/search'));
  expect(new URLSearchParams(router.state.location.search).get('q')).toBe('edge 0.25 AD3');
});

it('turns the units at once and keeps them in the account', async () => {
  withBuilds();
  const kept: unknown[] = [];
  server.use(
    http.patch('*/api/me', async ({ request }) => {
      kept.push(await request.json());
      return HttpResponse.json(makeMe({ units: 'mm' }));
    }),
  );
  const { user } = renderRoute('/stop');
  expect(await screen.findAllByText('a caliper, ± 0.005 in')).not.toHaveLength(0);
  await user.click(screen.getAllByRole('button', { name: 'mm' })[0]!);
  expect(screen.getAllByText('a caliper, ± 0.13 mm')).not.toHaveLength(0);
  await waitFor(() => expect(kept).toEqual([{ units: 'mm' }]));
  expect(localStorage.getItem('rivetside-units')).toBe('mm');
});

it('opens the account menu by keyboard, and Escape closes it and gives the focus back', async () => {
  withBuilds();
  const { user } = renderRoute('/stop');
  const button = await screen.findByRole('button', { name: 'Ottoline Brackwater: your account' });
  button.focus();
  await user.keyboard('{Enter}');
  expect(screen.getByRole('link', { name: 'Your account' })).toBeVisible();
  await user.tab();
  await user.keyboard('{Escape}');
  expect(button).toHaveFocus();
  expect(screen.queryByRole('link', { name: 'Your account' })).not.toBeInTheDocument();
});

it('signs out on this page even when the server cannot be told', async () => {
  withBuilds();
  server.use(http.post('*/api/auth/sign-out', () => HttpResponse.error()));
  server.use(http.get('*/api/me/sessions', () => HttpResponse.json({ items: [], nextCursor: null })));
  const complaint = jest.spyOn(console, 'error');
  const { user, router, queryClient } = renderRoute('/account');
  await user.click(await screen.findByRole('button', { name: 'Ottoline Brackwater: your account' }));
  await user.click(screen.getByRole('button', { name: 'Sign out' }));
  await waitFor(() => expect(router.state.location.pathname).toBe('/'));
  await waitFor(() => expect(session.me()).toBeNull());
  expect(await screen.findByRole('heading', { name: /second pair of hands/ })).toBeInTheDocument();
  expect(complaint).not.toHaveBeenCalled();
  expect(queryClient.getQueryCache().getAll()).toEqual([]);
});

it('says when there is no network, and takes it back', async () => {
  withBuilds();
  renderRoute('/stop');
  await screen.findByRole('heading', { name: 'Do not drill yet' });
  setOnline(false);
  expect(screen.getByText('No network.')).toBeInTheDocument();
  setOnline(true);
  expect(screen.queryByText('No network.')).not.toBeInTheDocument();
});

it('puts the sign-in over the page when the session is lost, and what was being sent goes on', async () => {
  withBuilds();
  const me: Me = makeMe();
  const fresh = { accessToken: 'fresh', expiresIn: 900, user: me };
  server.use(
    http.post('*/api/things', ({ request: { headers } }) =>
      headers.get('authorization') === 'Bearer fresh'
        ? HttpResponse.json({})
        : problem(401, 'Sign in first.'),
    ),
    http.post('*/api/auth/refresh', () => problem(401, 'Sign in first.')),
    http.post('*/api/auth/sign-in', () => HttpResponse.json(fresh)),
  );
  const { user, router } = renderRoute('/stop?sectionId=7');
  await screen.findByRole('heading', { name: 'Do not drill yet' });
  const writing = api.post('/things', { body: { text: 'half typed' } });
  const dialog = await screen.findByRole('dialog', { name: 'Your session has ended' });
  expect(within(dialog).getByLabelText('E-mail')).toHaveValue(me.email);
  await user.type(within(dialog).getByLabelText('Password'), 'seven pins and a loupe');
  await user.click(within(dialog).getByRole('button', { name: 'Sign in' }));
  await expect(writing).resolves.toBeUndefined();
  await waitFor(() => expect(screen.queryByRole('dialog')).not.toBeInTheDocument());
  expect(router.state.location.search).toBe('?sectionId=7');
});

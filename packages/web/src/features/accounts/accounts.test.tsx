import { screen, waitFor, within } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { session } from '../../lib/session';
import { makeMe } from '../../testing/make-me';
import { renderRoute } from '../../testing/render-route';
import { server } from '../../testing/server';

const problem = (status: number, body: object) =>
  HttpResponse.json({ status, ...body }, { status, headers: { 'content-type': 'application/problem+json' } });
const PASSWORD = 'seven pins and a loupe';
const people = [{ email: 'mentor@demo.rivetside.example', name: 'Imke Vosterlund', as: 'mentor' }];

/** Answers a write and remembers what was sent. */
function answering(path: string, answer: () => Response, method: 'post' | 'patch' | 'delete' = 'post') {
  const sent: unknown[] = [];
  server.use(
    http[method](`*/api${path}`, async ({ request }) => {
      sent.push(await request.json().catch(() => null));
      return answer();
    }),
  );
  return sent;
}
const noDemo = () => server.use(http.get('*/api/demo', () => problem(404, { title: 'Not found' })));
const noBuilds = () =>
  server.use(http.get('*/api/builds', () => HttpResponse.json({ items: [], nextCursor: null })));

describe('signing in', () => {
  it('sends nothing that cannot be right, says why at the field, and goes there', async () => {
    noDemo();
    const sent = answering('/auth/sign-in', () => problem(500, { title: 'never' }));
    const { user } = renderRoute('/sign-in', { me: null });
    await user.type(await screen.findByLabelText('E-mail'), 'otto at home');
    await user.click(screen.getByRole('button', { name: 'Sign in' }));
    const email = screen.getByLabelText('E-mail');
    expect(email).toHaveAccessibleDescription(/not an e-mail address/);
    expect(email).toBeInvalid();
    expect(email).toHaveFocus();
    expect(screen.getByLabelText('Password')).toHaveAccessibleDescription('Give your password.');
    expect(sent).toEqual([]);
  });

  it('keeps what was typed when the server refuses, and says what it says', async () => {
    noDemo();
    answering('/auth/sign-in', () => problem(401, { title: 'E-mail or password is wrong.' }));
    const { user } = renderRoute('/sign-in', { me: null });
    await user.type(await screen.findByLabelText('E-mail'), 'otto@example.org');
    await user.type(screen.getByLabelText('Password'), PASSWORD);
    await user.click(screen.getByRole('button', { name: 'Sign in' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('E-mail or password is wrong.');
    expect(screen.getByLabelText('E-mail')).toHaveValue('otto@example.org');
    expect(screen.getByLabelText('Password')).toHaveValue(PASSWORD);
  });

  it.each([
    ['/stop', '/stop'],
    ['https://elsewhere.example/', '/bench'],
    ['//elsewhere.example/', '/bench'],
    ['/\\elsewhere.example', '/bench'],
  ])('goes on to %s as %s', async (next, reached) => {
    noDemo();
    noBuilds();
    answering('/auth/sign-in', () => HttpResponse.json({ accessToken: 'a', expiresIn: 900, user: makeMe() }));
    const { user, router } = renderRoute(`/sign-in?next=${encodeURIComponent(next)}`, { me: null });
    await user.type(await screen.findByLabelText('E-mail'), 'otto@example.org');
    await user.type(screen.getByLabelText('Password'), `${PASSWORD}{Enter}`);
    await waitFor(() => expect(router.state.location.pathname).toBe(reached));
    expect(session.me()?.name).toBe('Ottoline Brackwater');
  });

  it('offers the people of the demo where there is one', async () => {
    server.use(http.get('*/api/demo', () => HttpResponse.json(people)));
    const sent = answering('/auth/sign-in', () => problem(429, { title: 'Too many tries.' }));
    const { user } = renderRoute('/sign-in', { me: null });
    await user.click(await screen.findByRole('button', { name: /Imke Vosterlund/ }));
    expect(await screen.findByRole('alert')).toHaveTextContent('Too many tries.');
    expect(sent).toEqual([{ email: 'mentor@demo.rivetside.example', password: 'rivetside-demo' }]);
  });
});

describe('making an account', () => {
  const fill = async (password: string) => {
    const { user } = renderRoute('/sign-up', { me: null });
    await user.type(await screen.findByLabelText('Name'), 'Ottoline Brackwater');
    await user.type(screen.getByLabelText('E-mail'), 'otto@example.org');
    await user.type(screen.getByLabelText('Password'), password);
    await user.click(screen.getByRole('button', { name: 'Make an account' }));
  };

  it('sends nothing with a short password', async () => {
    const sent = answering('/auth/sign-up', () => problem(500, { title: 'never' }));
    await fill('short');
    expect(screen.getByLabelText('Password')).toHaveAccessibleDescription(/at least 12 characters/);
    expect(sent).toEqual([]);
  });

  it('puts what the server refuses at the field that it names, and keeps the rest', async () => {
    const errors = [{ path: 'password', message: 'This password is among the first that are guessed.' }];
    answering('/auth/sign-up', () => problem(400, { title: 'Something in it cannot be', errors }));
    await fill('passwordpassword');
    await waitFor(() =>
      expect(screen.getByLabelText('Password')).toHaveAccessibleDescription(/first that are guessed/),
    );
    expect(screen.getByLabelText('Name')).toHaveValue('Ottoline Brackwater');
  });

  it('says that a mail is on its way', async () => {
    answering('/auth/sign-up', () =>
      HttpResponse.json({ message: 'A mail is on its way.' }, { status: 202 }),
    );
    await fill(PASSWORD);
    expect(await screen.findByText('A mail is on its way.')).toBeInTheDocument();
  });
});

describe('links from mails', () => {
  it('confirms an address only when a person presses', async () => {
    const sent = answering('/auth/confirm-email', () => new HttpResponse(null, { status: 204 }));
    const { user } = renderRoute('/confirm-email?token=a-long-enough-token-here', { me: null });
    const button = await screen.findByRole('button', { name: 'Confirm this address' });
    expect(sent).toEqual([]);
    await user.click(button);
    expect(await screen.findByText(/is confirmed/)).toBeInTheDocument();
    expect(sent).toEqual([{ token: 'a-long-enough-token-here' }]);
  });

  it('says in whole when a link is spent', async () => {
    const errors = [{ path: 'token', message: 'This link was used or is too old.' }];
    answering('/auth/reset-password', () => problem(400, { title: 'Something in it cannot be', errors }));
    const { user } = renderRoute('/reset-password?token=a-long-enough-token-here', { me: null });
    await user.type(await screen.findByLabelText('New password'), PASSWORD);
    await user.click(screen.getByRole('button', { name: 'Change the password' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('This link was used or is too old.');
    expect(screen.getByLabelText('New password')).toHaveValue(PASSWORD);
  });

  it('asks for the whole link when a mail program cut it', async () => {
    renderRoute('/reset-password', { me: null });
    expect(await screen.findByText(/The link is not whole/)).toBeInTheDocument();
  });
});

describe('the account', () => {
  const device = (id: string, name: string, current: boolean) => ({
    id,
    device: name,
    current,
    createdAt: '2025-05-10T06:15:00.000Z',
    lastUsedAt: '2025-05-12T06:15:00.000Z',
  });
  const open = () => {
    noBuilds();
    let items = [device('s1', 'Firefox on Linux', true), device('s2', 'Safari on a phone', false)];
    server.use(
      http.get('*/api/me/sessions', () => HttpResponse.json({ items, nextCursor: null })),
      http.delete('*/api/me/sessions/:id', ({ params }) => {
        items = items.filter(({ id }) => id !== params['id']);
        return new HttpResponse(null, { status: 204 });
      }),
    );
    return renderRoute('/account');
  };

  it('shows each device in the reader’s own time, and signs one out', async () => {
    const { user } = open();
    const phone = await screen.findByRole('button', { name: 'Sign out of Safari on a phone' });
    expect(phone.closest('li')).toHaveTextContent('signed in 10 May 25, 07:15, last used 12 May 25, 07:15');
    await user.click(phone);
    await waitFor(() => expect(phone).not.toBeInTheDocument());
    expect(screen.getByText('Firefox on Linux')).toBeInTheDocument();
  });

  it('keeps name, units and zone, and the page follows', async () => {
    const sent = answering('/me', () => HttpResponse.json(makeMe({ name: 'Otto B.', units: 'mm' })), 'patch');
    const { user } = open();
    const name = await screen.findByLabelText('Name');
    await user.clear(name);
    await user.type(name, 'Otto B.');
    await user.selectOptions(screen.getByLabelText('Units'), 'mm');
    await user.click(screen.getByRole('button', { name: 'Keep' }));
    expect(await screen.findByText('Kept.')).toBeInTheDocument();
    expect(sent[0]).toEqual({ name: 'Otto B.', units: 'mm', zone: 'Europe/London' });
    expect(screen.getByRole('button', { name: 'Otto B.: your account' })).toBeInTheDocument();
  });

  it('sends no name that cannot be one', async () => {
    const sent = answering('/me', () => problem(500, { title: 'never' }), 'patch');
    const { user } = open();
    const name = await screen.findByLabelText('Name');
    await user.clear(name);
    await user.click(screen.getByRole('button', { name: 'Keep' }));
    expect(name).toHaveAccessibleDescription(/as others know you/);
    expect(sent).toEqual([]);
  });

  it('keeps both passwords in their fields when the old one is wrong', async () => {
    const errors = [{ path: 'password', message: 'This is not your password.' }];
    answering('/me/password', () => problem(400, { title: 'Something in it cannot be', errors }));
    const { user } = open();
    const card = within(await screen.findByRole('region', { name: 'Password' }));
    await user.type(card.getByLabelText('Password now'), 'not this one');
    await user.type(card.getByLabelText('New password'), PASSWORD);
    await user.click(card.getByRole('button', { name: 'Change the password' }));
    await waitFor(() => expect(card.getByLabelText('Password now')).toBeInvalid());
    expect(card.getByLabelText('New password')).toHaveValue(PASSWORD);
  });
});

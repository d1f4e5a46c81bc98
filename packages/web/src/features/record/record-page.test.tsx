import type { Build, Entry, OpenItem } from '@rivetside/shared';
import { screen, waitFor, within } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { fakeLive } from '../../testing/fake-live';
import { keptOnDevice } from '../../testing/kept-on-device';
import { makeBuild, makeEntry, makeOpenItem } from '../../testing/make-build';
import { renderRoute } from '../../testing/render-route';
import { server } from '../../testing/server';

const list = (items: readonly unknown[], nextCursor: string | null = null) =>
  HttpResponse.json({ items, nextCursor });
const problem = (status: number, body: object) => HttpResponse.json({ status, ...body }, { status });

interface World {
  builds?: Build[];
  entries?: (query: URLSearchParams) => Response;
  items?: OpenItem[];
}
function record({ builds = [makeBuild()], entries, items = [] }: World = {}) {
  const world = { items };
  server.use(
    http.get('*/api/builds', () => list(builds)),
    http.get('*/api/builds/:id/entries', ({ request }) =>
      entries ? entries(new URL(request.url).searchParams) : list([makeEntry()]),
    ),
    http.get('*/api/builds/:id/open-items', () => list(world.items)),
  );
  return world;
}
function clearing(answer: () => Response) {
  const sent: unknown[] = [];
  server.use(
    http.post('*/api/open-items/:id/clearance', async ({ request }) => {
      sent.push(await request.json());
      return answer();
    }),
  );
  return sent;
}
const openItems = () => screen.findByRole('list', { name: 'Open items' });

beforeEach(() => void fakeLive());
afterEach(() => jest.restoreAllMocks());

describe('the entries', () => {
  it('say what was found and done, when, by whom, and lead to the question', async () => {
    record();
    renderRoute('/record');
    const [entry] = within(await screen.findByRole('list', { name: /Entries/ })).getAllByRole('listitem');
    for (const words of [
      '16 May 25, 20:30',
      'Fix · Stabiliser',
      'Next rivet size in hole 7 of the doubler',
      'Ottoline Brackwater, with Wilf',
      '1 hour 5 minutes',
      '2 photos',
    ])
      expect(entry).toHaveTextContent(words);
    expect(within(entry!).getByText('found').tagName).toBe('DT');
    expect(within(entry!).getByText('Opened to #21, one AD5').tagName).toBe('DD');
    expect(within(entry!).getByRole('link', { name: 'STB-Q-014' })).toHaveAttribute(
      'href',
      '/questions/0190a0b0-0000-7000-8000-00000000a014',
    );
  });

  it('come page by page, the newest first as they are answered', async () => {
    const entry = (title: string): Entry => makeEntry({ id: title, title });
    record({
      entries: (query) =>
        query.get('cursor') === 'next' ? list([entry('Older')]) : list([entry('Newer')], 'next'),
    });
    const { user } = renderRoute('/record');
    await user.click(await screen.findByRole('button', { name: 'Show more' }));
    await screen.findByText('Older');
    const entries = within(screen.getByRole('list', { name: /Entries/ }));
    expect(entries.getAllByRole('heading').map(({ textContent }) => textContent)).toEqual(['Newer', 'Older']);
  });

  it('say what makes the first one while there is none', async () => {
    record({ entries: () => list([]) });
    renderRoute('/record');
    expect(await screen.findByText('Nothing is written here yet.')).toBeInTheDocument();
  });

  it('say why they did not come, beside open items that did', async () => {
    record({ entries: () => problem(500, { title: 'The server is at its end.' }), items: [makeOpenItem()] });
    renderRoute('/record');
    expect(await screen.findByRole('alert', {}, { timeout: 5000 })).toHaveTextContent(
      'The server is at its end.',
    );
    expect(await openItems()).toHaveTextContent('Right root rib is on back-order');
  });
});

describe('an open item', () => {
  it('is cleared by saying what was done, and stays readable below', async () => {
    const world = record({
      items: [makeOpenItem(), makeOpenItem({ id: 'other', text: 'Dimple the last rib' })],
    });
    const cleared = makeOpenItem({ clearedAt: '2025-06-01T10:00:00.000Z', clearedNote: 'Rib came, fitted.' });
    const sent = clearing(() => {
      world.items = [makeOpenItem({ id: 'other', text: 'Dimple the last rib' }), cleared];
      return HttpResponse.json(cleared, { status: 201 });
    });
    const { user } = renderRoute('/record');
    await user.click(await screen.findByRole('button', { name: 'Clear: Right root rib is on back-order' }));
    await user.type(await screen.findByLabelText('What was done'), 'Rib came, fitted.');
    await user.click(screen.getByRole('button', { name: 'Clear it' }));
    await waitFor(async () => expect(await openItems()).not.toHaveTextContent('Right root rib'));
    expect(sent).toEqual([{ note: 'Rib came, fitted.' }]);
    expect(await openItems()).toHaveTextContent('Dimple the last rib');
    expect(screen.getByText('Cleared: Right root rib is on back-order')).toBeInTheDocument();
    expect(screen.getByText('One cleared')).toBeInTheDocument();
    expect(screen.getByText(/cleared 1 Jun 25: Rib came, fitted\./)).toBeInTheDocument();
    await waitFor(() => expect(keptOnDevice.size).toBe(0));
  });

  it('is not cleared without a word, and says so at the field', async () => {
    record({ items: [makeOpenItem()] });
    const sent = clearing(() => problem(500, { title: 'never' }));
    const { user } = renderRoute('/record');
    await user.click(await screen.findByRole('button', { name: /^Clear:/ }));
    await user.click(await screen.findByRole('button', { name: 'Clear it' }));
    expect(await screen.findByLabelText('What was done')).toHaveAccessibleDescription(/Say what was done/);
    expect(sent).toEqual([]);
  });

  it('keeps what was typed when the server refuses, and when the dialog is closed', async () => {
    record({ items: [makeOpenItem()] });
    clearing(() => problem(409, { title: 'This item is cleared already.' }));
    const { user } = renderRoute('/record');
    const open = async () => user.click(await screen.findByRole('button', { name: /^Clear:/ }));
    await open();
    await user.type(await screen.findByLabelText('What was done'), 'Rib came');
    await user.click(screen.getByRole('button', { name: 'Clear it' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('This item is cleared already.');
    expect(screen.getByLabelText('What was done')).toHaveValue('Rib came');
    await user.click(screen.getByRole('button', { name: 'Not yet' }));
    await waitFor(() => expect(screen.queryByLabelText('What was done')).not.toBeInTheDocument());
    expect(screen.getByRole('button', { name: /^Clear:/ })).toHaveFocus();
    await open();
    await waitFor(() => expect(screen.getByLabelText('What was done')).toHaveValue('Rib came'));
  });

  it('is not for those to clear who neither own the build nor help on it', async () => {
    record({ builds: [makeBuild({ mine: false })], items: [makeOpenItem()] });
    renderRoute('/record');
    await openItems();
    expect(screen.queryByRole('button', { name: /^Clear:/ })).not.toBeInTheDocument();
  });

  it('of a fix that somebody just carried out comes by itself', async () => {
    const fake = fakeLive();
    const world = record();
    renderRoute('/record');
    expect(await screen.findByText('Nothing is open on this build.')).toBeInTheDocument();
    world.items = [makeOpenItem({ text: 'Photo of the clean hole' })];
    fake.say('question.changed', { questionId: 'q', sectionId: null, chapterId: 'c' });
    expect(await screen.findByText('Photo of the clean hole')).toBeInTheDocument();
  });
});

describe('whose record it is', () => {
  it('can be chosen where there are two builds', async () => {
    const other = makeBuild({ id: 'other', serial: 88, owner: { id: 'jorun', name: 'Jorun Telsavik' } });
    record({ builds: [other, makeBuild()] });
    const { user, router } = renderRoute('/record');
    expect(await screen.findByRole('heading', { level: 1 })).toHaveTextContent('serial 141');
    await user.click(screen.getByRole('link', { name: /88, Jorun Telsavik/ }));
    await waitFor(() => expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent('serial 88'));
    expect(router.state.location.search).toBe('?build=other');
  });

  it('is nobody’s without a build', async () => {
    record({ builds: [] });
    renderRoute('/record');
    expect(await screen.findByText('No build stands in your name yet.')).toBeInTheDocument();
  });
});

import type { SearchHit } from '@rivetside/shared';
import { screen, within } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { renderRoute } from '../../testing/render-route';
import { server } from '../../testing/server';

const words = (text: string, hit = false) => ({ text, hit });
const hit = (facts: Partial<SearchHit>): SearchHit => ({
  kind: 'question',
  id: '0190a0b0-0000-7000-8000-00000000a014',
  sectionId: null,
  title: [words('Hole 7 in the '), words('doubler', true), words(' will not line up')],
  place: 'STB-Q-014 · Stabiliser · STB/dr-03',
  excerpt: [words('I have not drilled it.')],
  state: 'endorsed',
  standing: null,
  ...facts,
});
const PART = hit({
  kind: 'part',
  id: '0190a0b0-0000-7000-8000-00000000d003',
  sectionId: '0190a0b0-0000-7000-8000-000000005001',
  title: [words('STB/dr-03 rear-spar '), words('doubler', true)],
  place: 'Stabiliser',
  state: null,
});

function finding(answer: (query: URLSearchParams) => { items: SearchHit[]; nextCursor: string | null }) {
  const asked: string[] = [];
  server.use(
    http.get('*/api/builds', () => HttpResponse.json({ items: [], nextCursor: null })),
    http.get('*/api/search', ({ request }) => {
      const { searchParams } = new URL(request.url);
      asked.push(searchParams.toString());
      return HttpResponse.json(answer(searchParams));
    }),
  );
  return asked;
}
const all = (...items: SearchHit[]) => finding(() => ({ items, nextCursor: null }));
const main = () => within(screen.getByRole('main'));

it('groups what is found by its kind and marks the words', async () => {
  all(hit({}), PART);
  renderRoute('/search?q=doubler');
  const questions = await screen.findByRole('list', { name: 'Questions' });
  expect(within(questions).getByRole('link')).toHaveAccessibleName('Hole 7 in the doubler will not line up');
  expect(within(questions).getByText('doubler').tagName).toBe('MARK');
  expect(within(questions).getByText(/^endorsed$/i)).toBeInTheDocument();
  const parts = screen.getByRole('list', { name: 'Parts' });
  expect(within(parts).getByRole('link').getAttribute('href')).toMatch(
    /^\/sections\/0190a0b0-0000-7000-8000-000000005001/,
  );
});

it.each([
  ['withdrawn', 'stamp withdrawn'],
  ['held', 'stamp held'],
  ['expired', 'stamp past its date'],
] as const)('says in the line of a question when its stamp is %s', async (standing, said) => {
  all(hit({ standing }));
  renderRoute('/search?q=doubler');
  expect(await screen.findByRole('list', { name: 'Questions' })).toHaveTextContent(said);
});

it('takes text for text, whatever is written in it', async () => {
  all(hit({ excerpt: [words('<img src=x onerror=alert(1)>'), words('<b>edge</b>', true)] }));
  const { container } = renderRoute('/search?q=edge');
  expect(await screen.findByText('<b>edge</b>')).toBeInTheDocument();
  expect(container.querySelector('main img')).toBeNull();
});

it('puts the words into the address and asks for them as they are', async () => {
  const asked = all(hit({}));
  const { user, router } = renderRoute('/search');
  await user.type(await main().findByRole('searchbox', { name: 'Find' }), '0.387 AD6{Enter}');
  await screen.findByRole('list', { name: 'Questions' });
  expect(new URLSearchParams(router.state.location.search).get('q')).toBe('0.387 AD6');
  expect(asked).toEqual(['q=0.387+AD6']);
});

it('sends nothing where nothing was typed, and says so at the field', async () => {
  const asked = all();
  const { user } = renderRoute('/search');
  await user.click(await main().findByRole('button', { name: 'Find' }));
  expect(main().getByRole('searchbox')).toHaveAccessibleDescription(/Type what to look for/);
  expect(asked).toEqual([]);
});

it.each(['/search', '/search?q=%20'])('says at %s how to search, without asking', async (address) => {
  const asked = all();
  renderRoute(address);
  expect(await screen.findByText('What are you looking for?')).toBeInTheDocument();
  expect(main().getByRole('link', { name: '0.387 AD6' })).toHaveAttribute('href', '/search?q=0.387+AD6');
  expect(asked).toEqual([]);
});

it('says that nothing was found, and how to search', async () => {
  all();
  renderRoute('/search?q=propeller');
  expect(await screen.findByText('Nothing was found for “propeller”.')).toBeInTheDocument();
  expect(main().getByText(/a part by its number/)).toBeInTheDocument();
});

it('shows more on request, each in its group', async () => {
  finding((query) =>
    query.get('cursor') === null
      ? { items: [hit({})], nextCursor: 'next' }
      : { items: [PART, hit({ id: 'other', title: [words('Root doubler')] })], nextCursor: null },
  );
  const { user } = renderRoute('/search?q=doubler');
  await user.click(await screen.findByRole('button', { name: 'Show more' }));
  await screen.findByRole('list', { name: 'Parts' });
  expect(
    within(screen.getByRole('list', { name: 'Questions' }))
      .getAllByRole('link')
      .map((link) => link.textContent),
  ).toEqual(['Hole 7 in the doubler will not line up', 'Root doubler']);
});

it('says why the answer did not come, and tries again', async () => {
  let isDown = true;
  server.use(
    http.get('*/api/builds', () => HttpResponse.json({ items: [], nextCursor: null })),
    http.get('*/api/search', () =>
      isDown ? HttpResponse.error() : HttpResponse.json({ items: [hit({})], nextCursor: null }),
    ),
  );
  const { user } = renderRoute('/search?q=doubler');
  expect(await screen.findByRole('alert', {}, { timeout: 5000 })).toHaveTextContent('There is no network.');
  isDown = false;
  await user.click(screen.getByRole('button', { name: 'Try again' }));
  expect(await screen.findByRole('list', { name: 'Questions' })).toBeInTheDocument();
});

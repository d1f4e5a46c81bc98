import type { QuestionRow } from '@rivetside/shared';
import { act, screen, waitFor, within } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { fakeLive } from '../../testing/fake-live';
import { makeMe } from '../../testing/make-me';
import { makeQuestionRow } from '../../testing/make-question-row';
import { renderRoute } from '../../testing/render-route';
import { server } from '../../testing/server';

const list = (items: unknown[], nextCursor: string | null = null) => HttpResponse.json({ items, nextCursor });
const KIT = { id: '0190a0b0-0000-7000-8000-00000000f002', name: 'Fellwisp Two', maker: 'Fellwisp', kind: '' };
const SECTION = {
  id: '0190a0b0-0000-7000-8000-000000005001',
  kitId: KIT.id,
  code: 'STB',
  name: 'Stabiliser',
  position: 1,
  critical: false,
  regions: ['L-stab'],
  stepCount: 8,
  questions: { waiting: 1, underReview: 0, total: 1 },
  progress: [],
};

/** Answers the list with whatever `answer` says of its query, and remembers the queries. */
function answering(answer: (query: URLSearchParams) => Response) {
  const asked: string[] = [];
  server.use(
    http.get('*/api/questions', ({ request }) => {
      const { searchParams } = new URL(request.url);
      asked.push(searchParams.toString());
      return answer(searchParams);
    }),
    http.get('*/api/builds', () => list([])),
    http.get('*/api/kits', () => list([KIT])),
    http.get('*/api/kits/:id/sections', () => list([SECTION])),
    http.get('*/api/chapters', () => list([])),
  );
  return asked;
}
const holding = (...rows: QuestionRow[]) => answering(() => list(rows));
const titled = (title: string, facts: Partial<QuestionRow> = {}) =>
  makeQuestionRow({
    id: `0190a0b0-0000-7000-8000-${title.length.toString().padStart(12, '0')}`,
    title,
    ...facts,
  });
const lines = async () =>
  within(await screen.findByRole('list', { name: 'Questions' })).getAllByRole('listitem');

beforeEach(() => void fakeLive());
afterEach(() => jest.restoreAllMocks());

describe('the list of questions', () => {
  it('says of each its place, its trouble, its state and what it waits for', async () => {
    holding(makeQuestionRow({ unread: true }));
    renderRoute('/questions');
    const [line] = await lines();
    for (const words of [
      'STB-Q-014',
      'Stabiliser',
      'STB/dr-03',
      'HL-STB-3',
      'Ottoline Brackwater',
      'next size, pitch 3.9 D',
      'no fix yet, since 10 May 25',
      'something new',
    ])
      expect(line).toHaveTextContent(words);
    expect(line).toHaveTextContent(/open/i);
    expect(within(line!).getByRole('link', { name: /Hole 7 in the doubler/ })).toHaveAttribute(
      'href',
      `/questions/${makeQuestionRow().id}`,
    );
  });

  it('asks for what the address holds, and leaves out what it cannot mean', async () => {
    const asked = holding(makeQuestionRow());
    renderRoute(`/questions?state=advised&mine=true&sectionId=${SECTION.id}&sort=popular`);
    await lines();
    expect(new Set(asked)).toEqual(new Set([`state=advised&sectionId=${SECTION.id}&mine=true`]));
    expect(screen.getByRole('link', { name: 'Wait for a stamp' })).toHaveAttribute('aria-current', 'true');
    expect(screen.getByRole('checkbox', { name: 'Only mine' })).toBeChecked();
    await waitFor(() => expect(screen.getByLabelText('Section')).toHaveDisplayValue('Stabiliser'));
  });

  it('puts each filter into the address and asks anew', async () => {
    const asked = holding(makeQuestionRow());
    const { user, router } = renderRoute('/questions');
    await lines();
    await user.click(screen.getByRole('link', { name: 'No fix yet' }));
    await screen.findByRole('option', { name: 'Stabiliser' });
    await user.selectOptions(screen.getByLabelText('Section'), 'Stabiliser');
    await user.selectOptions(screen.getByLabelText('Discipline'), 'riveting');
    await user.type(screen.getByLabelText('Words or numbers'), 'edge 0.25');
    await user.click(screen.getByRole('checkbox', { name: 'Only mine' }));
    const whole = `q=edge+0.25&state=open&discipline=riveting&sectionId=${SECTION.id}&mine=true`;
    await waitFor(() => expect(router.state.location.search).toBe(`?${whole}`));
    await waitFor(() => expect(asked).toContain(whole));
  });

  it('follows the address back, words and all', async () => {
    holding(makeQuestionRow());
    const { router } = renderRoute('/questions?q=doubler');
    expect(await screen.findByLabelText('Words or numbers')).toHaveValue('doubler');
    await act(() => router.navigate('/questions'));
    await waitFor(() => expect(screen.getByLabelText('Words or numbers')).toHaveValue(''));
  });

  it('shows more on request, below what is there', async () => {
    answering((query) =>
      query.get('cursor') === 'next'
        ? list([titled('Longeron edge runs short')])
        : list([makeQuestionRow()], 'next'),
    );
    const { user } = renderRoute('/questions');
    await lines();
    await user.click(screen.getByRole('button', { name: 'Show more' }));
    expect(await screen.findByText('2 questions.')).toBeInTheDocument();
    expect((await lines()).map((line) => within(line).getByRole('heading').textContent)).toEqual([
      'Hole 7 in the doubler will not line up with the spar',
      'Longeron edge runs short',
    ]);
    expect(screen.queryByRole('button', { name: 'Show more' })).not.toBeInTheDocument();
  });

  it('keeps what is shown when the next ones do not come, and can be asked again', async () => {
    let isDown = true;
    answering((query) => {
      if (query.get('cursor') === null) return list([makeQuestionRow()], 'next');
      return isDown ? HttpResponse.json({ title: 'Broken.' }, { status: 500 }) : list([titled('Came later')]);
    });
    const { user } = renderRoute('/questions');
    await lines();
    await user.click(screen.getByRole('button', { name: 'Show more' }));
    expect(await screen.findByText(/The next ones did not come/, {}, { timeout: 5000 })).toBeInTheDocument();
    expect(await lines()).toHaveLength(1);
    isDown = false;
    await user.click(screen.getByRole('button', { name: 'Show more' }));
    expect(await screen.findByText('Came later')).toBeInTheDocument();
  });
});

describe('while it is open', () => {
  it('takes in what somebody else changes, once for a burst of changes', async () => {
    const fake = fakeLive();
    let rows = [makeQuestionRow()];
    const asked = answering(() => list(rows));
    renderRoute('/questions');
    await lines();
    rows = [
      makeQuestionRow({ state: 'advised', waits: { for: 'stamp', since: '2025-05-12T06:15:00.000Z' } }),
    ];
    const before = asked.length;
    const change = { questionId: rows[0]!.id, sectionId: SECTION.id, chapterId: rows[0]!.chapterId };
    for (let times = 0; times < 3; times++) fake.say('question.changed', change);
    expect(await screen.findByText('waits for a stamp, since 12 May 25')).toBeInTheDocument();
    expect(asked).toHaveLength(before + 1);
  });

  it('reads again after a break in the connection', async () => {
    const fake = fakeLive();
    let rows = [makeQuestionRow()];
    answering(() => list(rows));
    renderRoute('/questions');
    await lines();
    rows = [titled('Asked while the line was down'), ...rows];
    fake.reconnect();
    expect(await screen.findByText('Asked while the line was down')).toBeInTheDocument();
  });
});

describe('when there is nothing to list', () => {
  it('says what to do first to whoever may ask', async () => {
    holding();
    renderRoute('/questions');
    const title = await screen.findByText('No question has been asked yet.');
    const empty = title.closest('section') ?? title.parentElement!;
    expect(within(empty).getByRole('link', { name: 'Something is wrong' })).toHaveAttribute('href', '/stop');
  });

  it('offers to ask to nobody who may not', async () => {
    holding();
    renderRoute('/questions', { me: makeMe({ memberships: [] }) });
    await screen.findByText('No question has been asked yet.');
    expect(screen.queryByRole('link', { name: 'Something is wrong' })).not.toBeInTheDocument();
  });

  it('says that the filters are what leaves nothing, and shows everything again', async () => {
    answering((query) => list(query.get('state') === 'referred' ? [] : [makeQuestionRow()]));
    const { user } = renderRoute('/questions?state=referred');
    await screen.findByText('No question here fits all of that.');
    await user.click(screen.getByRole('link', { name: 'Show every question' }));
    expect(await lines()).toHaveLength(1);
  });

  it('says why the list did not come, and tries again', async () => {
    let isDown = true;
    answering(() => (isDown ? HttpResponse.error() : list([makeQuestionRow()])));
    const { user } = renderRoute('/questions');
    expect(await screen.findByRole('alert', {}, { timeout: 5000 })).toHaveTextContent('There is no network.');
    isDown = false;
    await user.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await lines()).toHaveLength(1);
  });
});

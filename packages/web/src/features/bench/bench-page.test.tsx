import type { Desk, Membership, Notice, Section, SectionSummary } from '@rivetside/shared';
import { screen, waitFor, within } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { fakeLive } from '../../testing/fake-live';
import { makeBuild, makeOpenItem } from '../../testing/make-build';
import { makeMe } from '../../testing/make-me';
import { makeQuestionRow } from '../../testing/make-question-row';
import { renderRoute } from '../../testing/render-route';
import { server } from '../../testing/server';

const list = (items: readonly unknown[]) => HttpResponse.json({ items, nextCursor: null });
const build = makeBuild();
const summary: SectionSummary = {
  id: '0190a0b0-0000-7000-8000-000000005001',
  kitId: build.kitId,
  code: 'STB',
  name: 'Stabiliser',
  position: 1,
  critical: false,
  regions: ['L-stab', 'R-stab'],
  stepCount: 2,
  questions: { waiting: 1, underReview: 0, total: 1 },
  progress: ['driven', 'pinned'],
};
const step = { work: 'assemble', estimateHours: 5, twoPerson: false, hazard: null } as const;
const section: Section = {
  ...summary,
  kitName: 'Fellwisp Two',
  steward: null,
  steps: [
    {
      ...step,
      id: '1',
      sectionId: summary.id,
      code: 'STB.1',
      number: 1,
      title: 'Prime the inside faces',
      closesStructure: false,
    },
    {
      ...step,
      id: '2',
      sectionId: summary.id,
      code: 'STB.2',
      number: 2,
      title: 'Close with the rear spar',
      closesStructure: true,
    },
  ],
  parts: [],
  holeLines: [],
  notices: [],
  metHere: [],
};
const notice = (facts: Partial<Notice>): Notice => ({
  id: 'n1',
  kitId: build.kitId,
  number: 'N1',
  title: 'no oversize in holes 1 to 8',
  class: 'beforeClose',
  revision: 'C',
  issuedOn: '2025-06-15',
  serialFrom: 1,
  serialTo: 200,
  sectionCodes: ['STB'],
  partNumbers: [],
  holeLineCodes: [],
  holes: null,
  text: 'Holes 1 to 8 of the doubler stay at their size.',
  ...facts,
});

interface World {
  builds?: unknown[];
  sections?: SectionSummary[];
  items?: unknown[];
  notices?: Notice[];
  questions?: (query: URLSearchParams) => unknown[];
  desk?: Desk;
  members?: unknown[];
}
const EMPTY_DESK: Desk = { firstFix: [], stamp: [], review: [] };
function bench(given: World = {}) {
  const world = {
    builds: [build],
    sections: [summary],
    items: [],
    notices: [],
    members: [],
    desk: EMPTY_DESK,
    ...given,
  };
  server.use(
    http.get('*/api/builds', () => list(world.builds)),
    http.get('*/api/builds/:id/open-items', () => list(world.items)),
    http.get('*/api/kits', () => list([])),
    http.get('*/api/kits/:id/sections', () => list(world.sections)),
    http.get('*/api/sections/:id', () => HttpResponse.json(section)),
    http.get('*/api/notices', () => list(world.notices)),
    http.get('*/api/questions', ({ request }) =>
      list(world.questions?.(new URL(request.url).searchParams) ?? []),
    ),
    http.get('*/api/desk', () => HttpResponse.json(world.desk)),
    http.get('*/api/chapters', () =>
      list([
        {
          id: 'c',
          name: 'Fenmoor',
          zone: 'Europe/London',
          currency: 'GBP',
          meets: 'first Saturdays',
          place: 'Marl Hollow barn',
          member: false,
        },
      ]),
    ),
    http.get('*/api/chapters/:id/members', () => list(world.members)),
  );
  return world;
}
const as = (facts: Partial<Membership>) =>
  makeMe({ memberships: [{ ...makeMe().memberships[0]!, ...facts }] });
const listed = async (name: string) => screen.findByRole('list', { name });

beforeEach(() => void fakeLive());
afterEach(() => jest.restoreAllMocks());

describe('the bench of a builder', () => {
  it('shows the section in hand, step by step, and asks about it', async () => {
    bench();
    renderRoute('/bench');
    expect(await screen.findByRole('heading', { name: 'Stabiliser' })).toBeInTheDocument();
    expect(screen.getByText('1 of 2 steps driven, 1 pinned · closes with step 2')).toBeInTheDocument();
    const steps = within(await listed('Steps of Stabiliser')).getAllByRole('listitem');
    expect(steps.map((one) => within(one).getByRole('img').getAttribute('aria-label'))).toEqual([
      expect.stringContaining('driven'),
      expect.stringContaining('pinned'),
    ]);
    expect(screen.getByRole('link', { name: 'Ask about this section' })).toHaveAttribute(
      'href',
      `/ask?sectionId=${summary.id}`,
    );
  });

  it('names what must be cleared before the section is closed, there and at the step that closes it', async () => {
    bench({ items: [makeOpenItem(), makeOpenItem({ id: 'fin', sectionId: 'fin', text: 'Rudder horn' })] });
    renderRoute('/bench');
    const items = await listed('Open in Stabiliser');
    expect(within(items).getAllByRole('listitem')).toHaveLength(1);
    expect(items).toHaveTextContent('Right root rib is on back-order');
    expect((await listed('Steps of Stabiliser')).lastElementChild).toHaveTextContent('1 open item');
  });

  it('clears an item from the bench', async () => {
    const world = bench({ items: [makeOpenItem()] });
    server.use(
      http.post('*/api/open-items/:id/clearance', () => {
        world.items = [];
        return HttpResponse.json(makeOpenItem({ clearedAt: '2025-06-01T10:00:00.000Z' }), { status: 201 });
      }),
    );
    const { user } = renderRoute('/bench');
    await user.click(await screen.findByRole('button', { name: /^Clear:/ }));
    await user.type(await screen.findByLabelText('What was done'), 'Rib came, fitted.');
    await user.click(screen.getByRole('button', { name: 'Clear it' }));
    expect(await screen.findByText('Nothing is open in Stabiliser.')).toBeInTheDocument();
  });

  it('lists own questions with their state, and takes in what somebody else does to them', async () => {
    const fake = fakeLive();
    let row = makeQuestionRow();
    const asked: string[] = [];
    bench({
      questions: (query) => {
        asked.push(query.toString());
        return [row];
      },
    });
    renderRoute('/bench');
    const questions = await listed('Your questions');
    expect(questions).toHaveTextContent('no fix yet, since 10 May 25');
    expect(asked[0]).toBe('mine=true&limit=6');
    row = makeQuestionRow({
      state: 'endorsed',
      waits: { for: 'builder', since: '2025-05-14T09:00:00.000Z' },
    });
    fake.say('question.changed', { questionId: row.id, sectionId: null, chapterId: row.chapterId });
    await waitFor(() => expect(questions).toHaveTextContent('to be carried out, since 14 May 25'));
  });

  it('shows the notices that reach the serial, the most pressing first, and no others', async () => {
    bench({
      notices: [
        notice({}),
        notice({ id: 'n2', number: 'N2', class: 'stopWork' }),
        notice({ id: 'n3', number: 'N3', serialFrom: 142 }),
        notice({ id: 'n4', number: 'N4', serialTo: 140 }),
        notice({ id: 'n5', number: 'N5', serialFrom: 141, serialTo: 141, class: 'information' }),
      ],
    });
    renderRoute('/bench');
    const notices = within(await listed('Notices for your kit')).getAllByRole('listitem');
    expect(notices.map((one) => one.textContent?.slice(0, 2))).toEqual(['N2', 'N1', 'N5']);
    expect(notices[0]).toHaveTextContent('stop work · 15 Jun 25');
  });

  it('says when every step is driven', async () => {
    bench({ sections: [{ ...summary, progress: ['driven', 'driven'] }] });
    renderRoute('/bench');
    expect(await screen.findByText('Every step of Fellwisp Two is driven.')).toBeInTheDocument();
  });

  it('goes on showing the rest when one part of it does not come', async () => {
    bench({ items: [makeOpenItem()] });
    server.use(
      http.get('*/api/notices', () => HttpResponse.json({ title: 'No notices now.' }, { status: 500 })),
    );
    renderRoute('/bench');
    expect(await screen.findByRole('alert', {}, { timeout: 5000 })).toHaveTextContent('No notices now.');
    expect(await listed('Open in Stabiliser')).toBeInTheDocument();
  });
});

describe('the bench of others', () => {
  it('of a mentor has the top of the desk and leads to it', async () => {
    bench({ builds: [], desk: { ...EMPTY_DESK, firstFix: [makeQuestionRow()] } });
    renderRoute('/bench', { me: as({ roles: ['mentor'], disciplines: ['sheetMetal'] }) });
    expect(await listed('What needs you most')).toHaveTextContent('Hole 7 in the doubler');
    expect(screen.getByRole('link', { name: 'To the mentor desk' })).toHaveAttribute('href', '/desk');
    expect(screen.queryByText('Your questions')).not.toBeInTheDocument();
  });

  it('of a chapter admin has what nobody answered, and which disciplines nobody mentors in', async () => {
    const queries: string[] = [];
    bench({
      builds: [],
      questions: (query) => {
        queries.push(query.toString());
        return [makeQuestionRow()];
      },
      members: [
        {
          userId: 'a',
          name: 'Imke Vosterlund',
          roles: ['mentor'],
          disciplines: ['riveting'],
          stampNumber: 'M-07',
        },
        { userId: 'b', name: 'Ottoline Brackwater', roles: ['builder'], disciplines: [], stampNumber: null },
      ],
    });
    renderRoute('/bench', { me: as({ roles: ['chapterAdmin'] }) });
    expect(await listed('No fix yet in Fenmoor')).toHaveTextContent('Hole 7 in the doubler');
    expect(queries.at(-1)).toMatch(/state=open/);
    const term = await screen.findByText('riveting');
    expect(term.nextElementSibling).toHaveTextContent('Imke Vosterlund (M‑07)');
    expect(screen.getByText('controls').nextElementSibling).toHaveTextContent('nobody yet');
    expect(screen.getByText('1 builder, 1 mentor')).toBeInTheDocument();
  });

  it('of somebody with several roles has a part for each', async () => {
    bench({ desk: { ...EMPTY_DESK, stamp: [makeQuestionRow()] } });
    renderRoute('/bench', {
      me: as({ roles: ['builder', 'mentor', 'chapterAdmin'], disciplines: ['riveting'] }),
    });
    expect(await screen.findByRole('heading', { name: 'Stabiliser' })).toBeInTheDocument();
    expect(await listed('What needs you most')).toBeInTheDocument();
    expect(await screen.findByText('Who mentors in Fenmoor')).toBeInTheDocument();
  });
});

describe('the bench before there is anything on it', () => {
  it('says where chapters meet to whoever is in none', async () => {
    bench({ builds: [] });
    renderRoute('/bench', { me: makeMe({ memberships: [] }) });
    expect(await screen.findByText('Your bench begins with a chapter.')).toBeInTheDocument();
    expect(await screen.findByText('Marl Hollow barn, first Saturdays')).toBeInTheDocument();
  });

  it('says who has the request of whoever asked to join', async () => {
    bench({ builds: [] });
    renderRoute('/bench', { me: as({ status: 'requested' }) });
    expect(await screen.findByText(/Fenmoor has your request/)).toBeInTheDocument();
  });

  it('says what a builder can do without a build', async () => {
    bench({ builds: [] });
    renderRoute('/bench');
    expect(await screen.findByText('No build stands in your name yet.')).toBeInTheDocument();
    expect(await screen.findByText(/You have asked nothing yet/)).toBeInTheDocument();
  });
});

import type { Kit, Section, SectionSummary } from '@rivetside/shared';
import { screen, waitFor, within } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { fakeLive } from '../testing/fake-live';
import { makeMe } from '../testing/make-me';
import { makeKit, makeSection, makeSectionSummary } from '../testing/make-section';
import { renderRoute } from '../testing/render-route';
import { server } from '../testing/server';

const kit = makeKit({ name: 'Fellwisp Two' });
const stabiliser = makeSectionSummary({
  stepCount: 4,
  progress: ['driven', 'pinned', 'todo', 'todo'],
  questions: { waiting: 2, underReview: 0, total: 5 },
});
const elevators = makeSectionSummary({
  id: '0190a0b0-0000-7000-8000-0000000000c6',
  code: 'ELV',
  name: 'Elevators',
  critical: true,
  regions: ['L-elev', 'R-elev'],
  questions: { waiting: 1, underReview: 1, total: 2 },
  progress: ['todo'],
});

interface Answers {
  readonly kits?: readonly Kit[];
  readonly sections?: () => readonly SectionSummary[] | Response;
  readonly section?: (id: string) => Section | Response;
}
const page = (items: readonly unknown[]) => HttpResponse.json({ items, nextCursor: null });
const answer = (said: unknown) =>
  said instanceof Response ? said : Array.isArray(said) ? page(said) : HttpResponse.json(said as object);

function answering({
  kits = [kit],
  sections = () => [stabiliser, elevators],
  section = () => makeSection(stabiliser),
}: Answers = {}) {
  server.use(
    http.get('*/api/builds', () => page([])),
    http.get('*/api/kits', () => page(kits)),
    http.get('*/api/kits/:id/sections', () => answer(sections())),
    http.get('*/api/sections/:id', ({ params }) => answer(section(String(params['id'])))),
  );
}
const broken = () =>
  HttpResponse.json(
    { type: 'about:blank', title: 'The server could not read it.', status: 500 },
    { status: 500, headers: { 'content-type': 'application/problem+json' } },
  );
const planView = () => screen.findByRole('group', { name: 'Plan view of the kit' });

beforeEach(() => void fakeLive());
afterEach(() => jest.restoreAllMocks());

it('shows the kit from above and from the side, and its sections with what waits in them', async () => {
  answering();
  renderRoute('/kit');
  const plan = await planView();
  expect(
    within(plan).getByRole('button', { name: 'Stabiliser, a question waits, 2 questions open' }),
  ).toBeInTheDocument();
  expect(
    within(screen.getByRole('group', { name: 'Side view of the kit' })).getByRole('button', {
      name: 'Elevators, held or under review, 2 questions open',
    }),
  ).toBeInTheDocument();
  const line = screen.getByRole('link', { name: /Elevators/ });
  expect(line).toHaveTextContent('1 step · 2 open questions · critical');
  expect(screen.getByRole('img', { name: '1 of 4 steps driven, 1 pinned' })).toBeInTheDocument();
  expect(screen.getByRole('navigation', { name: 'Where this is' })).toHaveTextContent('KitFellwisp Two');
});

it('opens a section from the plan, keeps it in the address, and says which is chosen', async () => {
  answering();
  const { user, router } = renderRoute('/kit');
  await user.click(within(await planView()).getByRole('button', { name: /^Stabiliser/ }));
  const section = await screen.findByRole('region', { name: 'Stabiliser' });
  expect(router.state.location.search).toBe(`?section=${stabiliser.id}`);
  expect(await within(section).findByRole('tab', { selected: true })).toHaveTextContent('Parts 2');
  expect(within(section).getByRole('table', { name: 'Parts' })).toHaveTextContent('STB/dr-03');
  expect(within(section).getByRole('link', { name: 'Open the section' })).toHaveAttribute(
    'href',
    `/sections/${stabiliser.id}`,
  );
  expect(within(await planView()).getByRole('button', { pressed: true })).toHaveAccessibleName(/^Stabiliser/);
  expect(screen.getByRole('link', { current: true })).toHaveTextContent('Stabiliser');
});

it('opens a section of the list with the keyboard alone', async () => {
  answering();
  const { user } = renderRoute('/kit');
  (await screen.findByRole('link', { name: /^Stabiliser/ })).focus();
  await user.keyboard('{Enter}');
  const tab = await screen.findByRole('tab', { name: 'Parts 2' });
  tab.focus();
  await user.keyboard('{ArrowRight}');
  expect(screen.getByRole('tab', { name: 'Steps 1' })).toHaveFocus();
  expect(screen.getByRole('tabpanel', { name: 'Steps 1' })).toHaveTextContent('doubler to spar');
  await user.keyboard('{ArrowLeft}{ArrowLeft}');
  expect(screen.getByRole('tab', { selected: true })).toHaveTextContent('Notices 0');
});

it('shows the progress of the reader instead, and the questions again', async () => {
  answering();
  const { user } = renderRoute(`/kit/${kit.id}?section=${stabiliser.id}`);
  const plan = await planView();
  await user.click(screen.getByRole('button', { name: 'Show my progress' }));
  const shown = within(plan).getByRole('button', { name: /^Stabiliser, pinned/ });
  expect(shown).toHaveAttribute('aria-pressed', 'true');
  expect(within(plan).getByRole('button', { name: /^Elevators, to do/ })).toBeInTheDocument();
  await user.click(screen.getByRole('button', { name: 'Show open questions' }));
  expect(within(plan).getByRole('button', { name: /^Stabiliser, chosen/ })).toBeInTheDocument();
});

it('offers no progress to whoever builds nothing', async () => {
  answering({ sections: () => [{ ...stabiliser, progress: [] }] });
  renderRoute('/kit');
  await planView();
  expect(screen.queryByRole('button', { name: 'Show my progress' })).not.toBeInTheDocument();
  expect(screen.queryByRole('img', { name: /steps driven/ })).not.toBeInTheDocument();
});

it('fills a region anew when somebody else asks there', async () => {
  const fake = fakeLive();
  let waiting = 0;
  answering({
    sections: () => [{ ...stabiliser, questions: { waiting, underReview: 0, total: waiting } }],
  });
  renderRoute('/kit');
  await within(await planView()).findByRole('button', { name: 'Stabiliser' });
  waiting = 1;
  const chapterId = makeMe().memberships[0]!.chapterId;
  fake.say('question.changed', { questionId: 'new', sectionId: stabiliser.id, chapterId });
  expect(
    await within(await planView()).findByRole('button', {
      name: 'Stabiliser, a question waits, 1 question open',
    }),
  ).toBeInTheDocument();
});

it.each([
  { kits: [], said: 'There is no kit here yet.' },
  { kits: [kit], said: 'Fellwisp Two has no sections yet.' },
])('says who puts a kit in: $said', async ({ kits, said }) => {
  answering({ kits, sections: () => [] });
  renderRoute('/kit');
  const empty = await screen.findByRole('region', { name: said });
  expect(empty).toHaveTextContent('A kit steward puts in');
});

it('says that there is no such kit', async () => {
  answering();
  renderRoute('/kit/0190a0b0-0000-7000-8000-0000000000ff');
  expect(await screen.findByRole('heading', { name: /no such kit/ })).toBeInTheDocument();
});

it('says why the sections could not be read, and reads them again', async () => {
  let isDown = true;
  answering({ sections: () => (isDown ? broken() : [stabiliser]) });
  const { user } = renderRoute('/kit');
  expect(await screen.findByRole('alert')).toHaveTextContent('The server could not read it.');
  isDown = false;
  await user.click(screen.getByRole('button', { name: 'Try again' }));
  expect(await planView()).toBeInTheDocument();
});

it('keeps plan and list where one section cannot be read', async () => {
  answering({ section: broken });
  renderRoute(`/kit/${kit.id}?section=${stabiliser.id}`);
  const section = await screen.findByRole('region', { name: 'Stabiliser' });
  await waitFor(() => expect(within(section).getByRole('alert')).toHaveTextContent('could not read it'));
  expect(await planView()).toBeInTheDocument();
});

import type { Build, Notice, Section, StepStates } from '@rivetside/shared';
import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { http, HttpResponse } from 'msw';
import { fakeLive } from '../testing/fake-live';
import { makeMe } from '../testing/make-me';
import { makeBuild, makeHoleLine, makeSection } from '../testing/make-section';
import { renderRoute } from '../testing/render-route';
import { server } from '../testing/server';

const [plain] = makeSection().steps;
const closing = {
  ...plain!,
  id: '0190a0b0-0000-7000-8000-0000000000e8',
  code: 'STB-8',
  number: 8,
  title: 'close with the rear spar',
  twoPerson: true,
  closesStructure: true,
  hazard: 'noise',
};
const notice: Notice = {
  id: '0190a0b0-0000-7000-8000-00000000ab01',
  kitId: makeSection().kitId,
  number: 'N1',
  title: 'no oversize in holes 1 to 8',
  class: 'beforeClose',
  revision: 'A',
  issuedOn: '2025-06-15',
  serialFrom: 10,
  serialTo: 20,
  sectionCodes: ['STB'],
  partNumbers: [],
  holeLineCodes: [],
  holes: '1-8',
  text: 'Replace the doubler.',
};
const section = makeSection({ steps: [plain!, closing], stepCount: 2, notices: [notice] });
const address = `/sections/${section.id}`;

interface Answers {
  readonly builds?: readonly Build[];
  readonly read?: () => Section | Response;
  readonly progress?: StepStates['steps'];
  readonly refuses?: boolean;
}
const problem = (status: number, title: string) =>
  HttpResponse.json(
    { type: 'about:blank', title, status },
    { status, headers: { 'content-type': 'application/problem+json' } },
  );

function answering({ builds = [], read = () => section, progress = [], refuses = false }: Answers = {}) {
  const put: StepStates[] = [];
  let steps = progress;
  server.use(
    http.get('*/api/builds', () => HttpResponse.json({ items: builds, nextCursor: null })),
    http.get('*/api/sections/:id', () => {
      const said = read();
      return said instanceof Response ? said : HttpResponse.json(said);
    }),
    http.get('*/api/builds/:id/sections/:sectionId/progress', () => HttpResponse.json({ steps })),
    http.put('*/api/builds/:id/sections/:sectionId/progress', async ({ request }) => {
      const body = (await request.json()) as StepStates;
      put.push(body);
      if (refuses) return problem(403, 'Only the builder and the crew mark progress.');
      const set = new Map(body.steps.map(({ stepId, state }) => [stepId, state]));
      steps = steps.map((step) => ({ ...step, state: set.get(step.stepId) ?? step.state }));
      return HttpResponse.json({ steps });
    }),
  );
  return put;
}
const states = [
  { stepId: plain!.id, state: 'driven' },
  { stepId: closing.id, state: 'todo' },
] as const;
const rowOf = (text: string) => screen.getByText(text).closest('tr')!;
const openTab = async (name: RegExp) => {
  await userEvent.click(await screen.findByRole('tab', { name }));
  return screen.findByRole('tabpanel', { name });
};

beforeEach(() => void fakeLive());
afterEach(() => jest.restoreAllMocks());

it('says of each step what may hurt in it, who is needed, and where it closes', async () => {
  answering();
  renderRoute(address);
  await screen.findByRole('heading', { name: 'Stabiliser', level: 1 });
  expect(rowOf('STB-8')).toHaveTextContent('two people · closes the structure · Hazard: noise');
  expect(rowOf('STB-3')).not.toHaveTextContent(/Hazard|two people|closes/);
  expect(screen.getByRole('navigation', { name: 'Where this is' })).toHaveTextContent(
    'Alderfly A-2Stabiliser',
  );
});

it.each([
  [/^Steps/, 'step 3', { stepId: plain!.id }],
  [/^Parts/, 'STB/dr-03', { partId: section.parts[1]!.id }],
  [/^Hole lines/, 'HL-STB-3', { holeLineId: section.holeLines[0]!.id }],
] as const)('hands the place on from %s', async (tab, about, place) => {
  answering();
  renderRoute(address);
  const link = within(await openTab(tab)).getByRole('link', { name: `Something is wrong here at ${about}` });
  const [path, search] = link.getAttribute('href')!.split('?');
  expect(path).toBe('/stop');
  expect(Object.fromEntries(new URLSearchParams(search))).toEqual({ sectionId: section.id, ...place });
});

it('lets only those ask who may: a mentor who builds nothing reads', async () => {
  answering();
  const [membership] = makeMe().memberships;
  const mentor = makeMe({ memberships: [{ ...membership!, roles: ['mentor'], disciplines: ['riveting'] }] });
  renderRoute(address, { me: mentor });
  const main = within(screen.getByRole('main'));
  await main.findByRole('heading', { name: 'Stabiliser' });
  expect(main.queryByRole('link', { name: /Something is wrong/ })).not.toBeInTheDocument();
});

it.each([
  { units: 'inch', through: 'STB/dr-03 0.063', hole: '#30 · 0.128', atMost: 'hole at most 0.132' },
  { units: 'mm', through: 'STB/dr-03 1.60', hole: '#30 · 3.26', atMost: 'hole at most 3.35' },
] as const)('gives a hole line in $units, with the limits of the kit maker', async (expected) => {
  const limits = {
    edgeMinimumD: 2.5,
    pitchMinimumD: null,
    holeMaximum: 0.132,
    shopHeadMinimumWidthD: null,
    shopHeadMinimumHeightD: null,
    source: 'drawing STB-3',
  };
  answering({ read: () => ({ ...section, holeLines: [makeHoleLine({ limits, questionCount: 2 })] }) });
  renderRoute(address, { units: expected.units });
  const panel = await openTab(/^Hole lines/);
  expect(panel).toHaveTextContent(expected.through);
  expect(panel).toHaveTextContent(expected.hole);
  expect(panel).toHaveTextContent(`Kit maker: edge at least 2.5 D, ${expected.atMost} (drawing STB-3)`);
  expect(within(panel).getByRole('link', { name: '2 asked at HL-STB-3' })).toHaveAttribute(
    'href',
    `/questions?holeLineId=${section.holeLines[0]!.id}`,
  );
});

it('says of a notice what class it is and whether it reaches the reader’s serial', async () => {
  answering({ builds: [makeBuild({ serial: 12 })], progress: [...states] });
  renderRoute(address);
  const panel = await openTab(/^Notices/);
  expect(panel).toHaveTextContent(/before close/i);
  expect(panel).toHaveTextContent('serials 10 to 20, holes 1 to 8');
  expect(panel).toHaveTextContent('Your serial 12 is among them.');
});

it('says of a notice beyond the reader’s serial that it is', async () => {
  answering({ builds: [makeBuild({ serial: 21 })], progress: [...states] });
  renderRoute(address);
  expect(await openTab(/^Notices/)).toHaveTextContent('Your serial 21 is not among them.');
});

it('sets how far the reader’s own build has come, step by step', async () => {
  const put = answering({ builds: [makeBuild()], progress: [...states] });
  const { user } = renderRoute(address);
  const step = await screen.findByRole('group', { name: 'Step 8 on my build' });
  await waitFor(() => expect(within(step).getByRole('radio', { name: 'to do' })).toBeChecked());
  await user.click(within(step).getByRole('radio', { name: 'pinned' }));
  await waitFor(() => expect(put).toEqual([{ steps: [{ stepId: closing.id, state: 'pinned' }] }]));
  expect(within(step).getByRole('radio', { name: 'pinned' })).toBeChecked();
  const other = screen.getByRole('group', { name: 'Step 3 on my build' });
  expect(within(other).getByRole('radio', { name: 'driven' })).toBeChecked();
});

it('goes back to how it was when the server refuses, and says so', async () => {
  answering({ builds: [makeBuild()], progress: [...states], refuses: true });
  const { user } = renderRoute(address);
  const step = await screen.findByRole('group', { name: 'Step 8 on my build' });
  await waitFor(() => expect(within(step).getByRole('radio', { name: 'to do' })).toBeChecked());
  await user.click(within(step).getByRole('radio', { name: 'driven' }));
  expect(await screen.findByRole('alert')).toHaveTextContent(
    'The step was not set. Only the builder and the crew mark progress.',
  );
  expect(within(step).getByRole('radio', { name: 'to do' })).toBeChecked();
});

it('stays at the tab that was opened when the reader’s build is read after it', async () => {
  answering({ progress: [...states] });
  let isRead: (() => void) | undefined;
  const read = new Promise<void>((resolve) => (isRead = resolve));
  server.use(
    http.get('*/api/builds', async () => {
      await read;
      return HttpResponse.json({ items: [makeBuild({ serial: 12 })], nextCursor: null });
    }),
  );
  renderRoute(address);
  const panel = await openTab(/^Notices/);
  expect(panel).not.toHaveTextContent('Your serial');
  isRead!();
  expect(await within(panel).findByText('Your serial 12 is among them.')).toBeInTheDocument();
});

it('says that progress could not be read, and shows no step as to do', async () => {
  answering({ builds: [makeBuild()] });
  server.use(
    http.get('*/api/builds/:id/sections/:sectionId/progress', () => problem(500, 'The disk is full.')),
  );
  renderRoute(address);
  expect(await screen.findByRole('alert')).toHaveTextContent(
    'How far your build has come could not be read. The disk is full.',
  );
  for (const radio of screen.getAllByRole('radio')) expect(radio).not.toBeChecked();
  expect(screen.getAllByRole('radio')[0]).toBeDisabled();
});

it.each([
  ['builds nothing', []],
  ['builds another kit', [makeBuild({ kitId: '0190a0b0-0000-7000-8000-0000000000ff' })]],
  ['may only read the build', [makeBuild({ mine: false })]],
])('offers no progress to whoever %s', async (_who, builds) => {
  answering({ builds });
  renderRoute(address);
  await screen.findByRole('heading', { name: 'Stabiliser', level: 1 });
  expect(screen.queryByRole('radio')).not.toBeInTheDocument();
});

it('lists what others met, with what was done', async () => {
  const met = {
    questionId: 'q1',
    number: 'STB-Q-001',
    title: 'Hole 7 will not line up',
    state: 'carriedOut',
    place: 'HL-STB-3',
    fixSummary: 'Open to #21, one AD5',
    carriedOutAt: '2025-05-17T12:00:00.000Z',
  } as const;
  answering({ read: () => ({ ...section, metHere: [met] }) });
  renderRoute(address);
  const panel = await openTab(/^What others met 1/);
  expect(panel).toHaveTextContent('Open to #21, one AD5, carried out 17 May 25');
  expect(within(panel).getByRole('link', { name: met.title })).toHaveAttribute('href', '/questions/q1');
});

it.each([
  [/^What others met 0/, 'Nobody has an endorsed fix in Stabiliser yet'],
  [/^Notices 0/, 'No notice of the kit maker touches this section.'],
])('says of %p that there is none', async (tab, said) => {
  answering({ read: () => ({ ...section, notices: [] }) });
  renderRoute(address);
  expect(await openTab(tab)).toHaveTextContent(said);
});

it('reads the section again when somebody else asks there', async () => {
  const fake = fakeLive();
  let waiting = 0;
  answering({ read: () => ({ ...section, questions: { waiting, underReview: 0, total: waiting } }) });
  renderRoute(address);
  expect(await screen.findByText(/none open/)).toBeInTheDocument();
  waiting = 1;
  const chapterId = makeMe().memberships[0]!.chapterId;
  fake.say('question.changed', { questionId: 'new', sectionId: section.id, chapterId });
  expect(await screen.findByText(/1 open question/)).toBeInTheDocument();
});

it('says that there is no such section', async () => {
  answering({ read: () => problem(404, 'There is no such section.') });
  renderRoute(address);
  expect(await screen.findByRole('heading', { name: /no such section/ })).toBeInTheDocument();
});

it('says why the section could not be read, and reads it again', async () => {
  let isDown = true;
  answering({ read: () => (isDown ? problem(503, 'The server is going down.') : section) });
  const { user } = renderRoute(address);
  expect(await screen.findByRole('alert')).toHaveTextContent('The server is going down.');
  isDown = false;
  await user.click(screen.getByRole('button', { name: 'Try again' }));
  expect(await screen.findByRole('heading', { name: 'Stabiliser', level: 1 })).toBeInTheDocument();
});

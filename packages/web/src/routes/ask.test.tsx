import type { AskQuestion, Question } from '@rivetside/shared';
import { act, screen, waitFor, within } from '@testing-library/react';
import type { UserEvent } from '@testing-library/user-event';
import { http, HttpResponse } from 'msw';
import { keptOnDevice } from '../testing/kept-on-device';
import { fakeLive } from '../testing/fake-live';
import { makeMe } from '../testing/make-me';
import { makeQuestionRow } from '../testing/make-question-row';
import { renderRoute } from '../testing/render-route';
import { makeBuild, makeHoleLine, makeKit, makeSection, makeSectionSummary } from '../testing/make-section';
import { server } from '../testing/server';

const list = (...items: object[]) => HttpResponse.json({ items, nextCursor: null });
const section = makeSection();
const line = makeHoleLine();
const ON_THE_LINE = `/ask?sectionId=${section.id}&holeLineId=${line.id}&hole=7`;
const TITLE = 'Hole 7 in the doubler will not line up with the spar';
const BODY = 'Matched on the bench, off once clecoed. Nothing drilled since.';

function makeAsked(): Question {
  return {
    ...makeQuestionRow({ id: '0190a0b0-0000-7000-8000-00000000aa01', title: TITLE }),
    body: BODY,
    kitName: 'Alderfly A-2',
    step: null,
    part: null,
    holeLine: null,
    holes: [],
    buildId: null,
    builderIds: [],
    holeCard: null,
    fitCheck: null,
    photos: [],
    fixes: [],
    referral: null,
    completion: null,
    withdrawn: null,
    events: [],
    lastSeq: 1,
    seenSeq: 1,
  };
}

interface Asked {
  readonly key: string | null;
  readonly body: AskQuestion;
}

/** Answers every try with the next of the answers, the last one for good, and remembers what was asked. */
function answering(...answers: (() => Response)[]): Asked[] {
  const asked: Asked[] = [];
  server.use(
    http.post('*/api/questions', async ({ request }) => {
      const body = (await request.json()) as AskQuestion;
      asked.push({ key: request.headers.get('idempotency-key'), body });
      return answers[Math.min(asked.length, answers.length) - 1]!();
    }),
  );
  return asked;
}
const taken = () => HttpResponse.json(makeAsked(), { status: 201 });
const refusing = (body: object, status = 400) =>
  HttpResponse.json({ status, ...body }, { status, headers: { 'content-type': 'application/problem+json' } });

beforeEach(() => {
  fakeLive();
  server.use(
    http.get('*/api/kits', () => list(makeKit())),
    http.get('*/api/builds', () => list(makeBuild())),
    http.get('*/api/kits/:id/sections', () => list(makeSectionSummary())),
    http.get('*/api/sections/:id', () => HttpResponse.json(section)),
    http.post('*/api/questions/similar', () => list()),
    http.get('*/api/questions/:id', () => HttpResponse.json(makeAsked())),
  );
});
afterEach(() => jest.restoreAllMocks());

const field = (name: string | RegExp) => screen.findByRole('textbox', { name });
/** With the usual rivets to choose from. */
const rivet = () => screen.findByRole('combobox', { name: 'Rivet as drawn' });
const put = (user: UserEvent) => user.click(screen.getByRole('button', { name: 'Put it to the mentors' }));

async function sayWhatIsWrong(user: UserEvent) {
  await user.click(await screen.findByRole('radio', { name: 'Holes do not line up' }));
  await user.type(await field('In one line'), TITLE);
  await user.type(await field(/What you see/), BODY);
}

it('asks with place, hole card and usual discipline as typed, and opens the sheet', async () => {
  const asked = answering(taken);
  const { user, router } = renderRoute(ON_THE_LINE);
  await sayWhatIsWrong(user);
  await user.type(await field('Next hole, left'), '0.610');
  await put(user);
  await waitFor(() => expect(router.state.location.pathname).toBe(`/questions/${makeAsked().id}`));
  expect(asked).toHaveLength(1);
  expect(asked[0]!.body).toMatchObject({
    kitId: makeKit().id,
    sectionId: section.id,
    stepId: line.stepId,
    holeLineId: line.id,
    holes: [{ repeat: 1, hole: 7 }],
    buildId: makeBuild().id,
    chapterId: makeMe().memberships[0]!.chapterId,
    audience: 'chapter',
    mishap: 'misalignedHole',
    discipline: 'sheetMetal',
    title: TITLE,
    body: BODY,
    holeCard: { neighbours: [{ x: { value: -0.61, u: 0.005 }, y: 0 }] },
    photoIds: [],
  });
  await waitFor(() => expect(keptOnDevice.size).toBe(0));
});

describe('coming from a hole line', () => {
  it('has place, stack, rivet and hole filled in, and the address no longer holds them', async () => {
    const { user, router } = renderRoute(ON_THE_LINE);
    await user.click(await screen.findByRole('radio', { name: 'Holes do not line up' }));
    expect(await screen.findByRole('combobox', { name: 'Hole line' })).toHaveValue(line.id);
    expect(screen.getByRole('combobox', { name: 'Step' })).toHaveValue(line.stepId!);
    expect(screen.getByRole('combobox', { name: 'Section' })).toHaveValue(section.id);
    expect(await field('Hole numbers')).toHaveValue('7');
    expect(await rivet()).toHaveValue('470 AD4');
    expect(screen.getAllByRole('textbox', { name: 'Thickness' })[1]).toHaveValue('0.063');
    expect(screen.getAllByRole('combobox', { name: 'Alloy' })[0]).toHaveValue('2024-T3 clad');
    expect(router.state.location.search).toBe('');
  });

  it('lets the asker decide where another draft is half written', async () => {
    const me = makeMe();
    const first = renderRoute('/ask', { me });
    await first.user.type(await field('In one line'), 'Gap at the rudder cap');
    await waitFor(() => expect(keptOnDevice.size).toBe(1));
    first.unmount();
    const { user } = renderRoute(ON_THE_LINE, { me });
    expect(await screen.findByText(/“Gap at the rudder cap”/)).toBeVisible();
    expect(await screen.findByRole('combobox', { name: 'Section' })).toHaveValue('');
    await user.click(screen.getByRole('button', { name: 'Throw it away and begin here' }));
    expect(await screen.findByRole('combobox', { name: 'Hole line' })).toHaveValue(line.id);
    expect(await field('In one line')).toHaveValue('');
  });
});

it('sends nothing that cannot be right, and says why at the field and above', async () => {
  const asked = answering(taken);
  const { user } = renderRoute('/ask');
  await user.click(await screen.findByRole('radio', { name: 'Holes do not line up' }));
  await user.type(await field('In one line'), 'off');
  await user.type(await rivet(), '470 AD4');
  await user.type((await screen.findAllByRole('textbox', { name: 'Largest across' }))[0]!, 'a bit');
  await put(user);
  const summary = await screen.findByRole('alert');
  expect(summary).toHaveFocus();
  expect(
    within(summary)
      .getAllByRole('button')
      .map(({ textContent }) => textContent),
  ).toEqual([
    'Say in which section it is, or that it is about the whole build.',
    'Say in one line what is wrong: at least 8 characters.',
    'Say what you see and what you have done so far.',
    expect.stringMatching(/a bit/),
  ]);
  expect(await field('In one line')).toHaveAccessibleDescription(/at least 8 characters/);
  expect(screen.getByRole('combobox', { name: 'Section' })).toBeInvalid();
  expect(asked).toEqual([]);
  await user.click(within(summary).getByRole('button', { name: /a bit/ }));
  expect((await screen.findAllByRole('textbox', { name: 'Largest across' }))[0]).toHaveFocus();
});

it('puts the words of the server at their fields, takes the focus to the summary, and keeps everything', async () => {
  const errors = [
    { path: 'holes.0.hole', message: 'This line has 6 holes.' },
    { path: 'holeCard.neighbours.0.x.value', message: 'That is further than the sheet is long.' },
    { path: 'title', message: 'Say it in other words.' },
  ];
  const asked = answering(() => refusing({ title: 'Some of it cannot be.', errors }), taken);
  const { user, router } = renderRoute(ON_THE_LINE);
  await sayWhatIsWrong(user);
  // The first row is left blank: the card's first neighbour is the form's second.
  await user.type(await field('Next hole, right'), '64');
  await put(user);
  const summary = await screen.findByRole('alert');
  await waitFor(() => expect(summary).toHaveFocus());
  expect(await field('Hole numbers')).toHaveAccessibleDescription(/This line has 6 holes/);
  expect(await field('Next hole, right')).toHaveAccessibleDescription(/further than the sheet/);
  expect(await field('Next hole, right')).toHaveValue('64');
  expect(await field('In one line')).toHaveValue(TITLE);
  expect(await field(/What you see/)).toHaveValue(BODY);

  await user.clear(await field('Hole numbers'));
  expect(within(summary).queryByText(/This line has 6 holes/)).toBeNull();
  expect(within(summary).getByText('Say it in other words.')).toBeVisible();
  await user.type(await field('In one line'), ' at all');
  await put(user);
  await waitFor(() => expect(router.state.location.pathname).toMatch(/^\/questions\//));
  // Another question is another write.
  expect(asked[1]!.key).not.toBe(asked[0]!.key);
});

describe('without a network', () => {
  const online = (isOnline: boolean) => {
    jest.spyOn(navigator, 'onLine', 'get').mockReturnValue(isOnline);
    act(() => void window.dispatchEvent(new Event(isOnline ? 'online' : 'offline')));
  };

  it('says so, keeps the question, sends it once with the key it began with, and opens the sheet', async () => {
    const asked = answering(() => HttpResponse.error(), taken);
    const { user, router } = renderRoute(ON_THE_LINE);
    await sayWhatIsWrong(user);
    online(false);
    await put(user);
    expect(await screen.findByText(/kept on this device and is sent once/)).toBeVisible();
    expect(await field('In one line')).toBeDisabled();
    await waitFor(() => expect(asked).toHaveLength(1));
    online(true);
    await waitFor(() => expect(router.state.location.pathname).toMatch(/^\/questions\//));
    online(true);
    expect(asked).toHaveLength(2);
    expect(asked[1]).toEqual(asked[0]);
  });

  it('goes on after a closed tab with the same question and key', async () => {
    const me = makeMe();
    const asked = answering(() => HttpResponse.error(), taken);
    const first = renderRoute(ON_THE_LINE, { me });
    await sayWhatIsWrong(first.user);
    online(false);
    await put(first.user);
    await waitFor(() => expect(asked).toHaveLength(1));
    await waitFor(() => expect(keptOnDevice.has(`sending:ask:${me.id}`)).toBe(true));
    first.unmount();
    const { router } = renderRoute('/ask', { me });
    expect(await screen.findByText(/kept on this device and is sent once/)).toBeVisible();
    online(true);
    await waitFor(() => expect(router.state.location.pathname).toMatch(/^\/questions\//));
    expect(asked).toHaveLength(2);
    expect(asked[1]).toEqual(asked[0]);
  });

  it('gives the question back to be changed, and then does not send it by itself', async () => {
    const asked = answering(() => HttpResponse.error(), taken);
    const { user } = renderRoute(ON_THE_LINE);
    await sayWhatIsWrong(user);
    online(false);
    await put(user);
    await user.click(await screen.findByRole('button', { name: 'Take it back and change it' }));
    expect(await field('In one line')).toBeEnabled();
    expect(await field('In one line')).toHaveValue(TITLE);
    const before = asked.length;
    online(true);
    await act(() => new Promise((resolve) => setTimeout(resolve, 50)));
    expect(asked).toHaveLength(before);
  });
});

it('goes on by itself after a session that was lost meanwhile', async () => {
  const me = makeMe();
  const asked = answering(() => refusing({ title: 'Sign in first.' }, 401), taken);
  server.use(
    http.post('*/api/auth/refresh', () => refusing({ title: 'The session has ended.' }, 401)),
    http.post('*/api/auth/sign-in', () =>
      HttpResponse.json({ accessToken: 'a-new-token', expiresIn: 900, user: me }),
    ),
  );
  const { user, router } = renderRoute(ON_THE_LINE, { me });
  await sayWhatIsWrong(user);
  await put(user);
  const dialog = await screen.findByRole('dialog');
  await user.type(within(dialog).getByLabelText('Password'), 'seven pins and a loupe');
  await user.click(within(dialog).getByRole('button', { name: /Sign in/ }));
  await waitFor(() => expect(router.state.location.pathname).toMatch(/^\/questions\//));
  expect(asked).toHaveLength(2);
  expect(asked[1]).toEqual(asked[0]);
});

it('takes a bare number in the reader’s millimetres and asks in inches', async () => {
  const asked = answering(taken);
  const { user } = renderRoute(ON_THE_LINE, { units: 'mm' });
  await sayWhatIsWrong(user);
  expect(screen.getAllByRole('textbox', { name: 'Thickness' })[1]).toHaveValue('1.6002');
  await user.type(await field('Next hole, left'), '15.5');
  await put(user);
  await waitFor(() => expect(asked).toHaveLength(1));
  const [{ x }] = asked[0]!.body.holeCard!.neighbours! as [{ x: { value: number } }];
  expect(x.value).toBeCloseTo(-15.5 / 25.4, 6);
});

it('keeps a draft over a closed tab, with the hour it was kept', async () => {
  const me = makeMe();
  const first = renderRoute('/ask', { me });
  await sayWhatIsWrong(first.user);
  await first.user.type(await rivet(), '426 AD3');
  first.unmount();
  renderRoute('/ask', { me });
  expect(await field('In one line')).toHaveValue(TITLE);
  expect(await rivet()).toHaveValue('426 AD3');
  expect(await screen.findByText(/draft kept on this device, \d\d:\d\d/)).toBeVisible();
});

it('draws and checks while the card is typed, and holds the last drawing while a number is half typed', async () => {
  const { user } = renderRoute(ON_THE_LINE);
  await user.click(await screen.findByRole('radio', { name: 'Holes do not line up' }));
  expect(await screen.findByRole('group', { name: 'Hole card, drawn to scale' })).toBeVisible();
  const table = screen.getByRole('table', { name: /Fit check/ });
  expect(table).not.toHaveTextContent('0.156 over 0.132');
  const [own, other] = await screen.findAllByRole('textbox', { name: 'Largest across' });
  await user.type(own!, '#30');
  await user.type(other!, '0.1285');
  await user.type(await field('Layers off by'), '0.027');
  await waitFor(() => expect(screen.getByRole('table', { name: /Fit check/ })).toHaveTextContent('0.156'));
  await user.clear(await rivet());
  expect(screen.getByRole('group', { name: 'Hole card, drawn to scale' })).toBeVisible();
});

it('shows what was met before, in words, and asks for it once the hands rest', async () => {
  const queries: unknown[] = [];
  const question = makeQuestionRow({
    title: 'Root doubler, hole 9 off from the web hole',
    state: 'carriedOut',
  });
  server.use(
    http.post('*/api/questions/similar', async ({ request }) => {
      queries.push(await request.json());
      return list({ question, alikeIn: ['trouble', 'head'], differsIn: [], score: 0.8, holeCard: null });
    }),
  );
  const { user } = renderRoute('/ask');
  await user.type(await field('In one line'), 'Doubler off');
  expect(await screen.findByRole('link', { name: question.title })).toBeVisible();
  expect(screen.getByText('alike in trouble, head · carried out')).toBeVisible();
  expect(queries).toEqual([expect.objectContaining({ text: 'Doubler off' })]);
});

it('is not open to whoever builds nowhere', async () => {
  const me = makeMe();
  renderRoute('/ask', { me: { ...me, memberships: [{ ...me.memberships[0]!, roles: ['mentor'] }] } });
  await waitFor(() => expect(screen.getByRole('main')).toHaveTextContent(/builder/));
  expect(screen.queryByRole('button', { name: 'Put it to the mentors' })).toBeNull();
});

import type { Question } from '@rivetside/shared';
import { act, screen, waitFor, within } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { fakeLive } from '../testing/fake-live';
import { keptOnDevice } from '../testing/kept-on-device';
import { makeMe } from '../testing/make-me';
import {
  makeEvent,
  makeFix,
  makeMentor,
  makeSheet,
  makeStamp,
  MENTOR,
  SECOND,
  SHEET_ID,
} from '../testing/make-sheet';
import { renderRoute } from '../testing/render-route';
import { server } from '../testing/server';

type Body = Record<string, unknown>;
const address = `/questions/${SHEET_ID}`;
const list = (...items: object[]) => HttpResponse.json({ items, nextCursor: null });
const problem = (body: object, status: number) =>
  HttpResponse.json({ status, ...body }, { status, headers: { 'content-type': 'application/problem+json' } });

let live: ReturnType<typeof fakeLive>;
function serve(sheet: Question): void {
  server.use(http.get(`*/api/questions/${SHEET_ID}`, () => HttpResponse.json(sheet)));
}
/** Remembers what is sent to an address, and answers each time with the next answer, the last for good. */
function taking(path: string, ...answers: (() => Response)[]): { body: Body; key: string | null }[] {
  const sent: { body: Body; key: string | null }[] = [];
  server.use(
    http.post(`*/api${path}`, async ({ request }) => {
      sent.push({ body: (await request.json()) as Body, key: request.headers.get('idempotency-key') });
      return answers[Math.min(sent.length, answers.length) - 1]!();
    }),
  );
  return sent;
}

beforeEach(() => {
  live = fakeLive();
  server.use(
    http.get('*/api/builds', () => list()),
    http.get('*/api/questions/similar', () => list()),
    http.put('*/api/questions/:id/seen', () => new HttpResponse(null, { status: 204 })),
    http.get('*/api/chapters/:id/members', () => list()),
  );
});
afterEach(() => jest.restoreAllMocks());

describe('reading a sheet', () => {
  it('shows place, numbers, fix and stamp as they stand', async () => {
    serve(makeSheet({ state: 'endorsed', fixes: [makeFix({ endorsements: [makeStamp()] })] }));
    renderRoute(address);
    expect(await screen.findByRole('heading', { level: 1, name: makeSheet().title })).toBeVisible();
    expect(screen.getByRole('table', { name: /Fit check/ })).toBeVisible();
    expect(screen.getByRole('heading', { name: 'Open to #21 and drive one AD5' })).toBeVisible();
    expect(screen.getByText('Eyes and ears.')).toBeVisible();
    expect(screen.getByRole('img', { name: /Stamp M-08, Dezso Harrowmeck/ })).toBeInTheDocument();
    expect(screen.getByText(/drawing note: note 4; this case only/)).toBeVisible();
  });

  it('says that a question is not there, and nothing more', async () => {
    server.use(http.get(`*/api/questions/${SHEET_ID}`, () => problem({ title: 'Not found' }, 404)));
    renderRoute(address);
    expect(await screen.findByText(/There is no such question, or it is not yours to see/)).toBeVisible();
  });

  it('marks what is new since the reader was here', async () => {
    serve(makeSheet({ events: [1, 2, 3].map((seq) => makeEvent({ seq })), lastSeq: 3, seenSeq: 2 }));
    renderRoute(address);
    const mark = await screen.findByText('new since you were here');
    expect(mark.compareDocumentPosition(screen.getByText('line 2'))).toBe(Node.DOCUMENT_POSITION_PRECEDING);
    expect(mark.compareDocumentPosition(screen.getByText('line 3'))).toBe(Node.DOCUMENT_POSITION_FOLLOWING);
  });
});

describe('a live sheet', () => {
  it('shows what others do in the order of its numbers, none twice', async () => {
    serve(makeSheet());
    renderRoute(address);
    await screen.findByRole('log');
    await waitFor(() => expect(live.joined(SHEET_ID)).toBe(true));
    expect(live.afterSeq(SHEET_ID)).toBe(1);
    act(() => [2, 2, 3].forEach((seq) => live.event(makeEvent({ seq }))));
    await screen.findByText('line 3');
    const said = within(screen.getByRole('log')).getAllByText(/^line \d$/);
    expect(said.map(({ textContent }) => textContent)).toEqual(['line 2', 'line 3']);
    expect(live.afterSeq(SHEET_ID)).toBe(3);
  });

  it('fetches what lies between when a number is missing', async () => {
    serve(makeSheet());
    server.use(
      http.get(`*/api/questions/${SHEET_ID}/events`, ({ request }) => {
        expect(new URL(request.url).searchParams.get('after')).toBe('1');
        return HttpResponse.json({
          items: [makeEvent({ seq: 2 }), makeEvent({ seq: 3 })],
          lastSeq: 4,
          nextCursor: null,
        });
      }),
    );
    renderRoute(address);
    await screen.findByRole('log');
    act(() => live.event(makeEvent({ seq: 4 })));
    expect(await screen.findByText('line 4')).toBeVisible();
    expect(screen.getAllByText(/^line \d$/).map(({ textContent }) => textContent)).toEqual([
      'line 2',
      'line 3',
      'line 4',
    ]);
  });

  it('changes the state with a stamp, says who is there and who writes, and when the line is broken', async () => {
    serve(makeSheet({ state: 'advised', fixes: [makeFix()] }));
    renderRoute(address);
    await screen.findByRole('log');
    const standing = { state: 'endorsed', waits: { for: 'builder', since: '2026-11-11T08:00:00.000Z' } };
    act(() => {
      live.event(
        makeEvent({ seq: 2, type: 'endorsement', by: SECOND, data: { endorsement: makeStamp(), standing } }),
      );
      live.presence({
        questionId: SHEET_ID,
        people: [
          { userId: SECOND.id, name: SECOND.name, writing: true },
          { userId: makeMe().id, name: makeMe().name, writing: false },
        ],
      });
      live.state(SHEET_ID, 'cutOff');
    });
    expect(await screen.findByText(/^endorsed$/i)).toBeVisible();
    expect(screen.getByRole('img', { name: /Stamp M-08/ })).toBeInTheDocument();
    expect(screen.getByText(/2 at the sheet/)).toBeVisible();
    expect(screen.getByText('Dezso is writing…')).toBeVisible();
    expect(screen.getByText(/The connection is broken/)).toBeVisible();
  });
});

describe('talking', () => {
  const say = async (user: ReturnType<typeof renderRoute>['user'], words: string) => {
    await user.type(await screen.findByLabelText('Write to the bench'), words);
    await user.click(screen.getByRole('button', { name: 'Send' }));
  };

  it('sends a line once, says that one is writing, and shows it once when it is heard too', async () => {
    serve(makeSheet());
    const event = makeEvent({
      seq: 2,
      by: { id: makeMe().id, name: makeMe().name },
      data: { id: 'm', body: 'By caliper.', photos: [] },
    });
    const sent = taking(`/questions/${SHEET_ID}/messages`, () => HttpResponse.json(event, { status: 201 }));
    const { user } = renderRoute(address);
    await say(user, 'By caliper.');
    expect(await screen.findByText('By caliper.')).toBeVisible();
    await waitFor(() => expect(screen.queryByText(/on its way/)).toBeNull());
    act(() => live.event(event));
    expect(screen.getAllByText('By caliper.')).toHaveLength(1);
    expect(sent).toHaveLength(1);
    expect(live.written).toContain(true);
    expect(live.written.at(-1)).toBe(false);
  });

  it('sends nothing for an empty line', async () => {
    serve(makeSheet());
    const sent = taking(`/questions/${SHEET_ID}/messages`, () => HttpResponse.json({}));
    const { user } = renderRoute(address);
    await user.click(await screen.findByRole('button', { name: 'Send' }));
    expect(await screen.findByText('Write a line first.')).toBeVisible();
    expect(sent).toEqual([]);
  });

  it('keeps a refused line until its writer decides, and a line without a network under one key', async () => {
    serve(makeSheet());
    const sent = taking(
      `/questions/${SHEET_ID}/messages`,
      () => HttpResponse.error(),
      () => problem({ title: 'This question was withdrawn.' }, 409),
    );
    const { user } = renderRoute(address);
    await say(user, 'Still here?');
    await waitFor(() => expect(sent.length).toBeGreaterThan(0));
    expect(await screen.findByText(/on its way; kept on this device/)).toBeVisible();
    act(() => void window.dispatchEvent(new Event('online')));
    expect(await screen.findByText('This question was withdrawn.')).toBeVisible();
    expect(screen.getByText('Still here?')).toBeVisible();
    expect(new Set(sent.map(({ key }) => key)).size).toBe(1);
    await user.click(screen.getByRole('button', { name: 'Take it back' }));
    expect(screen.queryByText('Still here?')).toBeNull();
  });

  it('asks for a missing number in one tap', async () => {
    const { holeCard, fitCheck } = makeSheet();
    serve(makeSheet({ holeCard, fitCheck: { ...fitCheck!, missing: ['the thickness of every layer'] } }));
    const sent = taking(`/questions/${SHEET_ID}/messages`, () =>
      HttpResponse.json(makeEvent({ seq: 2 }), { status: 201 }),
    );
    const { user } = renderRoute(address, { me: makeMentor() });
    await user.click(await screen.findByRole('button', { name: 'the thickness of every layer' }));
    await waitFor(() =>
      expect(sent[0]?.body).toEqual({ body: 'Please measure: the thickness of every layer.' }),
    );
  });
});

describe('advising', () => {
  it('is not offered to a builder', async () => {
    serve(makeSheet({ state: 'advised', fixes: [makeFix()] }));
    renderRoute(address);
    await screen.findByRole('log');
    expect(screen.queryByRole('button', { name: /Propose/ })).toBeNull();
    expect(screen.queryByRole('button', { name: 'Endorse' })).toBeNull();
    expect(screen.queryByRole('button', { name: 'Carry it out' })).toBeNull();
  });

  it('prefills the operations of the chosen remedy, refuses an empty one at its field, and keeps what was typed', async () => {
    serve(makeSheet());
    const sent = taking(
      `/questions/${SHEET_ID}/fixes`,
      () => problem({ title: 'It does not fit how things stand', detail: 'It is withdrawn.' }, 409),
      () => HttpResponse.json(makeFix(), { status: 201 }),
    );
    const { user } = renderRoute(address, { me: makeMentor() });
    await user.click(await screen.findByRole('button', { name: 'Propose a fix' }));
    const dialog = await screen.findByRole('dialog');
    await user.click(await within(dialog).findByRole('radio', { name: /Next rivet size/ }));
    expect(within(dialog).getByLabelText('In a line')).toHaveValue('Open to #21 and drive one AD5');
    const first = within(dialog).getByLabelText('Op 10');
    await user.clear(first);
    await user.click(within(dialog).getByRole('button', { name: 'Propose it' }));
    expect((await within(dialog).findAllByText('Say what is to be done.')).length).toBeGreaterThan(0);
    expect(sent).toEqual([]);
    await user.type(first, 'Clamp a guide bush midway.');
    await user.click(within(dialog).getByRole('button', { name: 'Propose it' }));
    expect(await within(dialog).findByText(/It is withdrawn\./)).toBeVisible();
    expect(first).toHaveValue('Clamp a guide bush midway.');
    await user.click(within(dialog).getByRole('button', { name: 'Propose it' }));
    await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull());
    expect(sent[1]!.body).toMatchObject({
      kind: 'nextSize',
      operations: expect.arrayContaining([
        { no: 10, text: 'Clamp a guide bush midway.', caution: 'Eyes and ears.' },
      ]),
    });
    await waitFor(() =>
      expect([...keptOnDevice.keys()].filter((key) => String(key).includes('fix:'))).toEqual([]),
    );
  });

  it('explains to the proposer why they cannot stamp', async () => {
    serve(makeSheet({ state: 'advised', fixes: [makeFix()] }));
    renderRoute(address, { me: makeMentor() });
    expect(await screen.findByText('Nobody stamps their own fix: another mentor does.')).toBeVisible();
  });

  it('draws the stamp before it is given, and asks for a reason where a line is outside', async () => {
    const check = makeFix().check!;
    const outside = {
      ...check,
      checks: check.checks.map((line, at) => (at === 0 ? { ...line, verdict: 'outside' as const } : line)),
    };
    serve(makeSheet({ state: 'advised', fixes: [makeFix({ check: outside })] }));
    const reason = 'A line of the check is outside published numbers: say why it stands all the same.';
    const sent = taking(
      `/fixes/${makeFix().id}/endorsements`,
      () =>
        problem({ title: 'Something in it cannot be', errors: [{ path: 'reason', message: reason }] }, 400),
      () => HttpResponse.json(makeStamp(), { status: 201 }),
    );
    server.use(
      http.get('*/api/chapters/:id/members', () =>
        list({
          userId: SECOND.id,
          name: SECOND.name,
          roles: ['mentor'],
          disciplines: [],
          stampNumber: 'M-08',
        }),
      ),
    );
    const { user } = renderRoute(address, { me: makeMentor(SECOND) });
    await user.click(await screen.findByRole('button', { name: 'Endorse' }));
    const dialog = await screen.findByRole('dialog');
    await user.click(await within(dialog).findByRole('radio', { name: /drawing note/i }));
    expect(
      await within(dialog).findByRole('img', { name: /Stamp M-08, Dezso Harrowmeck/ }),
    ).toBeInTheDocument();
    await user.click(within(dialog).getByRole('button', { name: 'Give the stamp' }));
    expect((await within(dialog).findAllByText(reason)).length).toBeGreaterThan(0);
    await user.type(within(dialog).getByLabelText(/Why, although/), 'Not loaded there.');
    await user.click(within(dialog).getByRole('button', { name: 'Give the stamp' }));
    await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull());
    expect(sent[1]!.body).toMatchObject({ basis: 'drawingNote', reason: 'Not loaded there.' });
  });
});

describe('carrying out', () => {
  it('says what is not ticked, refuses words for minutes at the field, and sends what was measured', async () => {
    serve(makeSheet({ state: 'endorsed', fixes: [makeFix({ endorsements: [makeStamp()] })] }));
    const sent = taking(`/questions/${SHEET_ID}/completion`, () =>
      HttpResponse.json(makeSheet(), { status: 201 }),
    );
    const { user } = renderRoute(address);
    await user.click(await screen.findByRole('button', { name: 'Carry it out' }));
    const dialog = await screen.findByRole('dialog');
    await user.click(await within(dialog).findByRole('checkbox', { name: 'hole 7 only' }));
    expect(within(dialog).getByText(/becomes an open item of your build: 1 so far/)).toBeVisible();
    await user.type(within(dialog).getByLabelText('Final drill'), '#21');
    await user.type(within(dialog).getByLabelText('Edge, spar'), '10.2 mm');
    await user.type(within(dialog).getByLabelText('Edge, doubler'), '0,402');
    await user.type(within(dialog).getByLabelText('Minutes'), 'half an hour');
    await user.click(within(dialog).getByRole('button', { name: 'Carried out' }));
    expect((await within(dialog).findAllByText('Give the minutes as a number.')).length).toBeGreaterThan(0);
    expect(sent).toEqual([]);
    await user.clear(within(dialog).getByLabelText('Minutes'));
    await user.type(within(dialog).getByLabelText('Minutes'), '35');
    await user.click(within(dialog).getByRole('button', { name: 'Carried out' }));
    await waitFor(() => expect(sent).toHaveLength(1));
    expect(sent[0]!.body).toMatchObject({
      minutes: 35,
      conditionsMet: ['hole 7 only'],
      asDone: { finalDrill: '#21' },
    });
    const { edgeDistances } = sent[0]!.body['asDone'] as { edgeDistances: number[] };
    expect(edgeDistances.map((edge) => edge.toFixed(4))).toEqual(['0.4016', '0.4020']);
  });
});

describe('what may change later', () => {
  it('lets its giver withdraw a stamp with a reason, and objects with one', async () => {
    serve(makeSheet({ state: 'endorsed', fixes: [makeFix({ endorsements: [makeStamp()] })] }));
    const sent = taking(`/endorsements/${makeStamp().id}/withdrawal`, () =>
      HttpResponse.json(makeStamp({ state: 'withdrawn' })),
    );
    const { user } = renderRoute(address, { me: makeMentor(SECOND) });
    await user.click(await screen.findByRole('button', { name: 'Withdraw the stamp' }));
    const dialog = await screen.findByRole('dialog');
    await user.click(await within(dialog).findByRole('button', { name: 'Withdraw it' }));
    expect(await within(dialog).findByText('Say why in a few words.')).toBeVisible();
    expect(sent).toEqual([]);
    await user.type(within(dialog).getByLabelText('Reason'), 'The drawing changed');
    await user.click(within(dialog).getByRole('button', { name: 'Withdraw it' }));
    await waitFor(() => expect(sent[0]?.body).toEqual({ reason: 'The drawing changed' }));
  });

  it('shows an objection and lets a mentor answer it; nobody stamps until then', async () => {
    const objection = {
      id: '0190a0b0-0000-7000-8000-00000000ff01',
      fixId: makeFix().id,
      by: SECOND,
      at: '2026-11-12T08:00:00.000Z',
      reason: 'Too thin there',
      answered: null,
    };
    serve(makeSheet({ state: 'underReview', fixes: [makeFix({ objections: [objection] })] }));
    const sent = taking(`/objections/${objection.id}/answer`, () =>
      HttpResponse.json({ ...objection, answered: { at: objection.at, by: MENTOR, answer: 'Measured' } }),
    );
    const { user } = renderRoute(address, { me: makeMentor() });
    expect(await screen.findByText(/Too thin there/)).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Answer it' }));
    const dialog = await screen.findByRole('dialog');
    await user.type(await within(dialog).findByLabelText('Answer'), 'Measured: 0.040 all along');
    await user.click(within(dialog).getByRole('button', { name: 'Answer' }));
    await waitFor(() => expect(sent[0]?.body).toEqual({ answer: 'Measured: 0.040 all along' }));
  });
});

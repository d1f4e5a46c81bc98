import type { SheetEvent } from '@rivetside/shared';
import { waitFor } from '@testing-library/react';
import { makeMe } from '../testing/make-me';
import { access } from './access';
import { live } from './live';

type Handler = (...said: unknown[]) => void;

/** The other end of the line, as far as a page can tell. */
class Line {
  connected = false;
  readonly said: { name: string; body: unknown; answer?: Handler }[] = [];
  private readonly handlers = new Map<string, Handler[]>();
  private every: Handler[] = [];

  on(name: string, handler: Handler): void {
    this.handlers.set(name, [...(this.handlers.get(name) ?? []), handler]);
  }
  onAny(handler: Handler): void {
    this.every.push(handler);
  }
  timeout(): this {
    return this;
  }
  emit(name: string, body: unknown, answer?: Handler): void {
    this.said.push({ name, body, ...(answer ? { answer } : {}) });
  }
  connect(): void {
    this.connected = true;
    this.hear('connect');
  }
  disconnect(): void {
    this.connected = false;
  }
  hear(name: string, ...said: unknown[]): void {
    this.handlers.get(name)?.forEach((handler) => handler(...said));
    if (!['connect', 'disconnect', 'connect_error'].includes(name))
      this.every.forEach((one) => one(name, ...said));
  }
  cut(): void {
    this.connected = false;
    this.hear('disconnect', 'transport close');
  }
  joins() {
    return this.said.filter(({ name }) => name === 'sheet:join');
  }
}

let line: Line;
jest.mock('socket.io-client', () => ({ io: () => (line = new Line()) }));

const event = (seq: number, questionId = 'q1'): SheetEvent =>
  ({ questionId, seq, type: 'message', at: '', by: { id: 'p', name: 'P' }, data: {} }) as SheetEvent;

function listener(facts: { afterSeq?: number } = {}) {
  const heard = { seqs: [] as number[], states: [] as string[], gaps: 0, people: [] as unknown[] };
  return {
    heard,
    afterSeq: () => facts.afterSeq ?? heard.seqs.at(-1) ?? 0,
    onEvent: ({ seq }: SheetEvent) => void heard.seqs.push(seq),
    onPresence: (people: unknown[]) => void heard.people.push(people),
    onState: (state: 'live' | 'cutOff') => void heard.states.push(state),
    onGap: () => void (heard.gaps += 1),
  };
}

async function joined(one = listener()) {
  const sheet = live.joinSheet('q1', one);
  await waitFor(() => expect(line).toBeDefined());
  if (!line.connected) line.connect();
  return { ...one, sheet };
}

beforeEach(() => {
  (line as unknown) = undefined;
  access.take({ accessToken: 't', expiresIn: 900, user: makeMe() });
});

it('joins after what it has seen, takes what was missed, and then is live', async () => {
  const { heard, sheet } = await joined(listener({ afterSeq: 4 }));
  expect(line.joins()[0]!.body).toEqual({ questionId: 'q1', afterSeq: 4 });
  line.joins()[0]!.answer!(null, { ok: true, whole: true, events: [event(5), event(6)] });
  line.hear('sheet:event', event(7));
  line.hear('sheet:event', event(1, 'another'));
  expect(heard.seqs).toEqual([5, 6, 7]);
  expect(heard.states).toEqual(['live']);
  sheet.leave();
});

it('says that it is cut off, and catches up by itself from the last that it saw', async () => {
  const { heard, sheet } = await joined();
  const reconnected = jest.fn<void, []>();
  const stop = live.onReconnect(reconnected);
  line.joins()[0]!.answer!(null, { ok: true, whole: true, events: [event(1)] });
  line.cut();
  expect(heard.states).toEqual(['live', 'cutOff']);
  line.connect();
  expect(line.joins()[1]!.body).toEqual({ questionId: 'q1', afterSeq: 1 });
  expect(reconnected).toHaveBeenCalledTimes(1);
  stop();
  sheet.leave();
});

it('tells of a gap when more was missed than is sent again', async () => {
  const { heard, sheet } = await joined();
  line.joins()[0]!.answer!(null, { ok: true, whole: false, events: [] });
  expect(heard).toMatchObject({ gaps: 1, states: ['live'] });
  sheet.leave();
});

it('has the page read anew what it may no longer see, and is not live', async () => {
  const { heard, sheet } = await joined();
  line.joins()[0]!.answer!(null, { ok: false, status: 404, title: 'Not found', detail: '' });
  expect(heard).toMatchObject({ gaps: 1, states: [] });
  sheet.leave();
});

it('says that somebody writes once in a while, and that they stopped at once', async () => {
  const { sheet } = await joined();
  sheet.writing(true);
  sheet.writing(true);
  sheet.writing(false);
  sheet.writing(false);
  const said = line.said.filter(({ name }) => name === 'sheet:writing').map(({ body }) => body);
  expect(said).toEqual([
    { questionId: 'q1', writing: true },
    { questionId: 'q1', writing: false },
  ]);
  sheet.leave();
});

it('leaves the sheet when the last listener has left, and hears nothing more', async () => {
  const first = await joined();
  const second = listener();
  const other = live.joinSheet('q1', second);
  first.sheet.leave();
  expect(line.said.some(({ name }) => name === 'sheet:leave')).toBe(false);
  other.leave();
  expect(line.said.at(-1)).toEqual({ name: 'sheet:leave', body: { questionId: 'q1' } });
  line.hear('sheet:event', event(9));
  expect(second.heard.seqs).toEqual([]);
});

it('hands on what is said to lists, until they stop listening', async () => {
  const changed = jest.fn();
  const stop = live.on('question.changed', changed);
  await waitFor(() => expect(line).toBeDefined());
  line.connect();
  const change = { questionId: 'q1', sectionId: null, chapterId: 'c1' };
  line.hear('question.changed', change);
  stop();
  line.hear('question.changed', change);
  expect(changed.mock.calls).toEqual([[change]]);
});

it('does not listen in the name of whoever signed out', async () => {
  const { sheet } = await joined();
  const first = line;
  access.drop();
  expect(first.connected).toBe(false);
  sheet.leave();
});

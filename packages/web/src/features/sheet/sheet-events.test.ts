import type { Fix, Question, SheetEvent } from '@rivetside/shared';
import { applySheetEvents, hasEarlierEvents, withEarlierEvents } from './sheet-events';

const by = { id: 'u1', name: 'Imke Vosterlund' };
const at = '2026-12-01T08:00:00.000Z';
const waits = { for: 'firstFix' as const, since: at };

const event = (seq: number, facts: Partial<SheetEvent> = {}): SheetEvent => ({
  questionId: 'q1',
  seq,
  type: 'message',
  at,
  by,
  data: { body: `line ${seq}`, photos: [] },
  ...facts,
});
const sheet = (lastSeq: number) =>
  ({
    id: 'q1',
    state: 'open',
    waits,
    fixes: [],
    referral: null,
    completion: null,
    withdrawn: null,
    lastSeq,
    lastActivityAt: at,
    events: Array.from({ length: lastSeq }, (_, index) => event(index + 1)),
  }) as unknown as Question;
const fix = (facts: Partial<Fix> = {}) =>
  ({
    id: 'f1',
    questionId: 'q1',
    endorsements: [],
    objections: [],
    withdrawn: null,
    ...facts,
  }) as unknown as Fix;
const numbers = (one: Question) => one.events.map(({ seq }) => seq);

describe('applySheetEvents', () => {
  it('adds what is new in the order of its numbers, however it arrives', () => {
    const { sheet: after, missingAfter } = applySheetEvents(sheet(2), [event(4), event(3)]);
    expect(numbers(after)).toEqual([1, 2, 3, 4]);
    expect(after.lastSeq).toBe(4);
    expect(missingAfter).toBeNull();
  });

  it('passes over what is already here', () => {
    const { sheet: after } = applySheetEvents(sheet(3), [event(2), event(3), event(3)]);
    expect(numbers(after)).toEqual([1, 2, 3]);
  });

  it('stops at a gap and says after which number to ask again', () => {
    const { sheet: after, missingAfter } = applySheetEvents(sheet(2), [event(3), event(5)]);
    expect(numbers(after)).toEqual([1, 2, 3]);
    expect(missingAfter).toBe(3);
  });

  it('leaves another sheet’s event alone', () => {
    expect(applySheetEvents(sheet(1), [event(2, { questionId: 'q2' })]).sheet).toEqual(sheet(1));
  });

  it('puts a fix, its stamp and an objection in their place and takes over the standing', () => {
    const stamp = { id: 's1', fixId: 'f1', questionId: 'q1' };
    const objection = { id: 'o1', fixId: 'f1' };
    const endorsed = { state: 'endorsed' as const, waits: { for: 'builder' as const, since: at } };
    const { sheet: after } = applySheetEvents(sheet(1), [
      event(2, { type: 'fix', data: { fix: fix() } }),
      event(3, { type: 'endorsement', data: { endorsement: stamp, standing: endorsed } }),
      event(4, { type: 'objection', data: { objection } }),
    ]);
    expect(after.fixes[0]).toMatchObject({ id: 'f1', endorsements: [stamp], objections: [objection] });
    expect(after).toMatchObject(endorsed);
  });

  it('keeps the stamps under a fix that is withdrawn later', () => {
    const stamp = { id: 's1', fixId: 'f1', questionId: 'q1' };
    const withdrawn = { at, reason: 'measured again' };
    const { sheet: after } = applySheetEvents(sheet(1), [
      event(2, { type: 'fix', data: { fix: fix() } }),
      event(3, { type: 'endorsement', data: { endorsement: stamp } }),
      event(4, { type: 'fixWithdrawn', data: { fix: fix({ withdrawn }) } }),
    ]);
    expect(after.fixes[0]).toMatchObject({ withdrawn, endorsements: [stamp] });
  });

  it('shows a withdrawn question with its reason', () => {
    const { sheet: after } = applySheetEvents(sheet(1), [
      event(2, { type: 'withdrawn', data: { reason: 'asked twice' } }),
    ]);
    expect(after.withdrawn).toEqual({ at, reason: 'asked twice' });
  });
});

describe('earlier talk', () => {
  it('is put in front once', () => {
    const late = { ...sheet(4), events: [event(3), event(4)] };
    expect(hasEarlierEvents(late)).toBe(true);
    const whole = withEarlierEvents(late, [event(2), event(1), event(3)]);
    expect(numbers(whole)).toEqual([1, 2, 3, 4]);
    expect(hasEarlierEvents(whole)).toBe(false);
  });
});

import { type FixFacts, type QuestionFacts, questionState, questionWaitsFor } from './question-state.js';

const fix = (facts: Partial<FixFacts> = {}): FixFacts => ({
  withdrawn: false,
  openObjection: false,
  stamps: [],
  ...facts,
});
const stamp = (
  byId = 'a',
  state: FixFacts['stamps'][number]['state'] = 'live',
  basis: FixFacts['stamps'][number]['basis'] = 'handbook',
) => ({
  byId,
  state,
  basis,
});
const facts = (given: Partial<QuestionFacts> = {}): QuestionFacts => ({
  critical: false,
  withdrawn: false,
  completed: false,
  referralWaiting: false,
  fixes: [],
  ...given,
});

describe('questionState', () => {
  it.each([
    { case: 'no fix', given: facts(), state: 'open', waits: 'firstFix' },
    {
      case: 'only a withdrawn fix',
      given: facts({ fixes: [fix({ withdrawn: true, stamps: [stamp()] })] }),
      state: 'open',
      waits: 'firstFix',
    },
    { case: 'a fix without a stamp', given: facts({ fixes: [fix()] }), state: 'advised', waits: 'stamp' },
    {
      case: 'one live stamp',
      given: facts({ fixes: [fix({ stamps: [stamp()] })] }),
      state: 'endorsed',
      waits: 'builder',
    },
    {
      case: 'an expired stamp',
      given: facts({ fixes: [fix({ stamps: [stamp('a', 'expired')] })] }),
      state: 'advised',
      waits: 'stamp',
    },
    {
      case: 'a withdrawn stamp',
      given: facts({ fixes: [fix({ stamps: [stamp('a', 'withdrawn')] })] }),
      state: 'advised',
      waits: 'stamp',
    },
    {
      case: 'one stamp in a critical section',
      given: facts({ critical: true, fixes: [fix({ stamps: [stamp()] })] }),
      state: 'advised',
      waits: 'secondStamp',
    },
    {
      case: 'two stamps of one person in a critical section',
      given: facts({ critical: true, fixes: [fix({ stamps: [stamp('a'), stamp('a')] })] }),
      state: 'advised',
      waits: 'secondStamp',
    },
    {
      case: 'two stamps in a critical section',
      given: facts({ critical: true, fixes: [fix({ stamps: [stamp('a'), stamp('b')] })] }),
      state: 'endorsed',
      waits: 'builder',
    },
    {
      case: 'two stamps in a critical section, one on experience',
      given: facts({
        critical: true,
        fixes: [fix({ stamps: [stamp('a'), stamp('b', 'live', 'experience')] })],
      }),
      state: 'advised',
      waits: 'secondStamp',
    },
    {
      case: 'two stamps on two fixes of a critical section',
      given: facts({ critical: true, fixes: [fix({ stamps: [stamp('a')] }), fix({ stamps: [stamp('b')] })] }),
      state: 'advised',
      waits: 'secondStamp',
    },
    {
      case: 'a stamp held by a notice',
      given: facts({ fixes: [fix({ stamps: [stamp('a', 'held')] })] }),
      state: 'underReview',
      waits: 'review',
    },
    {
      case: 'a stamp held after the work was done',
      given: facts({ completed: true, fixes: [fix({ stamps: [stamp('a', 'held')] })] }),
      state: 'underReview',
      waits: 'review',
    },
    {
      case: 'an open objection against a stamped fix',
      given: facts({ fixes: [fix({ openObjection: true, stamps: [stamp()] })] }),
      state: 'underReview',
      waits: 'review',
    },
    {
      case: 'an open objection against an unstamped fix',
      given: facts({ fixes: [fix({ openObjection: true })] }),
      state: 'advised',
      waits: 'stamp',
    },
    {
      case: 'a referral that waits',
      given: facts({ referralWaiting: true, fixes: [fix({ stamps: [stamp()] })] }),
      state: 'referred',
      waits: 'kitMaker',
    },
    {
      case: 'a completion',
      given: facts({ completed: true, fixes: [fix({ stamps: [stamp()] })] }),
      state: 'carriedOut',
      waits: 'nothing',
    },
    {
      case: 'a completion whose stamp was withdrawn later',
      given: facts({ completed: true, fixes: [fix({ stamps: [stamp('a', 'withdrawn')] })] }),
      state: 'carriedOut',
      waits: 'nothing',
    },
    {
      case: 'a withdrawal',
      given: facts({ withdrawn: true, fixes: [fix()] }),
      state: 'withdrawn',
      waits: 'nothing',
    },
  ])('is $state with $case and waits for $waits', ({ given, state, waits }) => {
    expect(questionState(given)).toBe(state);
    expect(questionWaitsFor(given)).toBe(waits);
  });
});

import type { SectionSummary } from '@rivetside/shared';
import { planFills, progressWords, sectionLine } from './plan-fills';

const section = (facts: Partial<SectionSummary>): SectionSummary => ({
  id: 'a',
  kitId: 'kit',
  code: 'STB',
  name: 'Stabiliser',
  position: 1,
  critical: false,
  regions: ['L-stab', 'R-stab'],
  stepCount: 8,
  questions: { waiting: 0, underReview: 0, total: 0 },
  progress: [],
  ...facts,
});

describe('planFills', () => {
  it.each([
    { case: 'nothing is asked', facts: {}, fill: 'none' },
    {
      case: 'a question waits',
      facts: { questions: { waiting: 1, underReview: 0, total: 1 } },
      fill: 'waits',
    },
    {
      case: 'one is held among others',
      facts: { questions: { waiting: 3, underReview: 1, total: 4 } },
      fill: 'held',
    },
  ])('fills a region with $fill when $case', ({ facts, fill }) => {
    expect(planFills([section(facts)], 'questions', null)['L-stab']).toMatchObject({
      label: 'Stabiliser',
      fill,
    });
  });

  it.each([
    { progress: [], fill: 'todo' },
    { progress: ['todo', 'todo'], fill: 'todo' },
    { progress: ['driven', 'todo'], fill: 'pinned' },
    { progress: ['driven', 'driven'], fill: 'driven' },
  ] as const)('shows progress $progress as $fill', ({ progress, fill }) => {
    expect(planFills([section({ progress: [...progress] })], 'progress', 'a')['R-stab']?.fill).toBe(fill);
  });

  it('fills the chosen section whatever waits there', () => {
    const asked = section({ questions: { waiting: 1, underReview: 0, total: 1 } });
    expect(planFills([asked], 'questions', 'a')['L-stab']?.fill).toBe('chosen');
  });
});

describe('what a section says of itself', () => {
  it('counts what is open, in the singular too, and that it is critical', () => {
    expect(
      sectionLine(section({ critical: true, questions: { waiting: 1, underReview: 0, total: 2 } })),
    ).toBe('8 steps · 1 open question · critical');
    expect(sectionLine(section({}))).toBe('8 steps · none open');
  });

  it('tells progress without a percentage', () => {
    expect(progressWords(['driven', 'pinned', 'todo'])).toBe('1 of 3 steps driven, 1 pinned');
  });
});

import type { SectionSummary, Step } from '@rivetside/shared';
import { makeQuestionRow } from '../../testing/make-question-row';
import { alsoBegun, progressWords, sectionInHand, stepLines, type StepState } from './section-in-hand';

const section = (name: string, position: number, progress: StepState[]): SectionSummary => ({
  id: name,
  kitId: 'kit',
  code: name,
  name,
  position,
  critical: false,
  regions: [],
  stepCount: progress.length,
  questions: { waiting: 0, underReview: 0, total: 0 },
  progress,
});
const step = (number: number, facts: Partial<Step> = {}): Step => ({
  id: `step ${number}`,
  sectionId: 'STB',
  code: `STB.${number}`,
  number,
  title: `Step ${number}`,
  work: 'assemble',
  estimateHours: 4,
  twoPerson: false,
  closesStructure: false,
  hazard: null,
  ...facts,
});

describe('the section on the bench', () => {
  it.each([
    {
      case: 'nothing is begun: the first',
      sections: [section('B', 2, ['todo']), section('A', 1, ['todo'])],
      name: 'A',
    },
    {
      case: 'one is begun',
      sections: [section('A', 1, ['todo', 'todo']), section('B', 2, ['pinned', 'todo'])],
      name: 'B',
    },
    {
      case: 'two are begun: the one further on',
      sections: [section('A', 1, ['driven', 'todo', 'todo']), section('B', 2, ['driven', 'pinned', 'todo'])],
      name: 'B',
    },
    {
      case: 'the one begun is all driven: the next',
      sections: [section('A', 1, ['driven', 'driven']), section('B', 2, ['todo', 'todo'])],
      name: 'B',
    },
  ])('is $name when $case', ({ sections, name }) => expect(sectionInHand(sections)?.name).toBe(name));

  it('is none when every step of every section is driven, and none where there is no section', () => {
    expect(sectionInHand([section('A', 1, ['driven'])])).toBeNull();
    expect(sectionInHand([])).toBeNull();
  });

  it('names the others that are begun and not finished', () => {
    const [a, b, c, d] = [
      section('A', 1, ['pinned', 'driven']),
      section('B', 2, ['pinned', 'todo']),
      section('C', 3, ['driven']),
      section('D', 4, ['todo']),
    ];
    expect(alsoBegun([a, b, c, d], a).map(({ name }) => name)).toEqual(['B']);
  });
});

describe('its steps', () => {
  const steps = [step(1), step(2), step(3, { closesStructure: true })];

  it('are counted in words, with the one that closes it', () => {
    expect(progressWords({ steps, progress: ['driven', 'pinned', 'todo'] })).toBe(
      '1 of 3 steps driven, 1 pinned · closes with step 3',
    );
    expect(progressWords({ steps: [step(1)], progress: ['todo'] })).toBe('0 of 1 steps driven');
  });

  const holeLines = [{ stepId: 'step 2', code: 'HL-STB-3' }] as never;
  const place = { id: 'STB', code: 'STB', name: 'Stabiliser', critical: false, regions: [] };
  const asked = makeQuestionRow({ section: place, holeLineCode: 'HL-STB-3', state: 'advised' });
  const lines = (
    questions: (typeof asked)[],
    items: { sectionId: string; clearedAt: string | null }[] = [],
  ) =>
    stepLines(
      { id: 'STB', steps, progress: ['driven', 'pinned', 'todo'], holeLines },
      questions,
      items as never,
    );

  it('wait on a question asked at one of their hole lines while it has no answer to go by', () => {
    expect(lines([asked]).map(({ waitsOn }) => waitsOn?.number ?? null)).toEqual([null, 'STB-Q-014', null]);
    expect(lines([{ ...asked, state: 'endorsed' }]).map(({ waitsOn }) => waitsOn)).toEqual([
      null,
      null,
      null,
    ]);
    expect(lines([{ ...asked, holeLineCode: null }])[1]?.waitsOn).toBeNull();
  });

  it('count the open items of the section on the step that closes it', () => {
    const items = [
      { sectionId: 'STB', clearedAt: null },
      { sectionId: 'STB', clearedAt: '2025-05-01T00:00:00.000Z' },
      { sectionId: 'FIN', clearedAt: null },
    ];
    expect(lines([], items).map(({ openItems }) => openItems)).toEqual([0, 0, 1]);
  });

  it('count them once where two steps close something, on the next of the two', () => {
    const both = [step(1, { closesStructure: true }), step(2, { closesStructure: true })];
    const items = [{ sectionId: 'STB', clearedAt: null }] as never;
    const counted = (progress: StepState[]) =>
      stepLines({ id: 'STB', steps: both, progress, holeLines: [] }, [], items).map(
        ({ openItems }) => openItems,
      );
    expect(counted(['pinned', 'todo'])).toEqual([1, 0]);
    expect(counted(['driven', 'todo'])).toEqual([0, 1]);
    expect(progressWords({ steps: both, progress: ['driven', 'todo'] })).toMatch(
      /closes with steps 1 and 2$/,
    );
  });
});

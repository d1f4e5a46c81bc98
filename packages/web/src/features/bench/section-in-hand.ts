import type { OpenItem, QuestionRow, Section, SectionSummary, Step } from '@rivetside/shared';

export type StepState = SectionSummary['progress'][number];

const isBegun = ({ progress }: SectionSummary) => progress.some((state) => state !== 'todo');
const isDriven = ({ progress }: SectionSummary) =>
  progress.length > 0 && progress.every((state) => state === 'driven');

/**
 * What lies on the bench: of the sections begun and not all driven the one with the most pinned or driven, for pins come
 * out before the next section is begun; else the first that is not driven; null when all of them are.
 */
export function sectionInHand(sections: readonly SectionSummary[]): SectionSummary | null {
  const left = sections.filter((section) => !isDriven(section));
  const touched = ({ progress }: SectionSummary) => progress.filter((state) => state !== 'todo').length;
  const [first] = left.filter(isBegun).sort((a, b) => touched(b) - touched(a) || a.position - b.position);
  return first ?? [...left].sort((a, b) => a.position - b.position)[0] ?? null;
}

/** Begun and not all driven, besides the one in hand. */
export function alsoBegun(sections: readonly SectionSummary[], inHand: SectionSummary): SectionSummary[] {
  return sections.filter((one) => one.id !== inHand.id && isBegun(one) && !isDriven(one));
}

/** "3 of 8 steps driven, 2 pinned · closes with step 8" */
export function progressWords({ progress, steps }: Pick<Section, 'progress' | 'steps'>): string {
  const count = (state: StepState) => progress.filter((one) => one === state).length;
  const pinned = count('pinned');
  const closing = steps.filter(({ closesStructure }) => closesStructure).map(({ number }) => number);
  const words = `${count('driven')} of ${steps.length} steps driven${pinned > 0 ? `, ${pinned} pinned` : ''}`;
  if (closing.length === 0) return words;
  return `${words} · closes with ${closing.length === 1 ? 'step' : 'steps'} ${closing.join(' and ')}`;
}

export interface StepLine {
  readonly step: Step;
  readonly state: StepState;
  readonly waitsOn: QuestionRow | null;
  /** On the next step that closes anything: what must be cleared before it. */
  readonly openItems: number;
}

const HOLDS: readonly QuestionRow['state'][] = ['open', 'advised', 'referred', 'underReview'];

/** Each step with its state and what it waits for: a question asked at one of its hole lines, or an open item. */
export function stepLines(
  section: Pick<Section, 'steps' | 'progress' | 'holeLines' | 'id'>,
  questions: readonly QuestionRow[],
  openItems: readonly OpenItem[],
): StepLine[] {
  const open = openItems.filter(({ clearedAt, sectionId }) => clearedAt === null && sectionId === section.id);
  const waiting = questions.filter((one) => one.section?.id === section.id && HOLDS.includes(one.state));
  const stateAt = (at: number) => section.progress[at] ?? 'todo';
  const next = section.steps.find((step, at) => step.closesStructure && stateAt(at) !== 'driven');
  return section.steps.map((step, at) => {
    const codes = section.holeLines.filter(({ stepId }) => stepId === step.id).map(({ code }) => code);
    return {
      step,
      state: stateAt(at),
      waitsOn:
        waiting.find(({ holeLineCode }) => holeLineCode !== null && codes.includes(holeLineCode)) ?? null,
      openItems: step.id === next?.id ? open.length : 0,
    };
  });
}

import type { Build, HoleLine, Kit, Section, SectionSummary } from '@rivetside/shared';
import { makeMe } from './make-me';

const id = (tail: string) => `0190a0b0-0000-7000-8000-${tail.padStart(12, '0')}`;

export function makeKit(facts: Partial<Kit> = {}): Kit {
  return { id: id('a1'), name: 'Alderfly A-2', maker: 'Alderfly Aircraft', kind: 'low wing', ...facts };
}

export function makeBuild(facts: Partial<Build> = {}): Build {
  const { id: ownerId, name, memberships } = makeMe();
  return {
    id: id('b1'),
    kitId: makeKit().id,
    kitName: makeKit().name,
    serial: 12,
    chapterId: memberships[0]!.chapterId,
    owner: { id: ownerId, name },
    crew: [],
    mentor: null,
    startedOn: '2025-03-01',
    mine: true,
    ...facts,
  };
}

/** A doubler on a rear spar, AD4 at 0.625. */
export function makeHoleLine(facts: Partial<HoleLine> = {}): HoleLine {
  return {
    id: id('d3'),
    sectionId: id('c5'),
    stepId: id('e3'),
    code: 'HL-STB-3',
    title: 'doubler to rear spar',
    stack: [
      { partId: id('f1'), number: 'STB/sp-02', name: 'Rear spar', alloy: '2024-T3 clad', thickness: 0.04 },
      { partId: id('f2'), number: 'STB/dr-03', name: 'Doubler', alloy: '2024-T3 clad', thickness: 0.063 },
    ],
    rivet: { head: 'universal', alloy: 'AD', dash: 4, lengthDash: null },
    callOut: '470 AD4-5',
    drill: '#30',
    holeDiameter: 0.1285,
    pitch: 0.625,
    edge: 0.336,
    count: 22,
    repeats: 1,
    drive: null,
    revision: 'A',
    limits: null,
    questionCount: 0,
    ...facts,
  };
}

function makeSummary(): SectionSummary {
  return {
    id: id('c5'),
    kitId: makeKit().id,
    code: 'STB',
    name: 'Stabiliser',
    position: 1,
    critical: false,
    regions: ['L-stab', 'R-stab'],
    stepCount: 1,
    questions: { waiting: 0, underReview: 0, total: 0 },
    progress: [],
  };
}

export const makeSectionSummary = (facts: Partial<SectionSummary> = {}): SectionSummary => ({
  ...makeSummary(),
  ...facts,
});

export function makeSection(facts: Partial<Section> = {}): Section {
  const sectionId = facts.id ?? makeSummary().id;
  const part = { sectionId, alloy: '2024-T3 clad', quantity: 1, hands: null, questionCount: 0 };
  return {
    ...makeSummary(),
    kitName: makeKit().name,
    steward: null,
    steps: [
      {
        id: id('e3'),
        sectionId,
        code: 'STB-3',
        number: 3,
        title: 'doubler to spar',
        work: 'assemble',
        estimateHours: 2,
        twoPerson: false,
        closesStructure: false,
        hazard: null,
      },
    ],
    parts: [
      { ...part, id: id('f1'), number: 'STB/sp-02', name: 'Rear spar', thickness: 0.04 },
      { ...part, id: id('f2'), number: 'STB/dr-03', name: 'Doubler', thickness: 0.063 },
    ],
    holeLines: [makeHoleLine()],
    notices: [],
    metHere: [],
    ...facts,
  };
}

import type {
  AskQuestion,
  Discipline,
  EndorseInput,
  Endorsement,
  Fix,
  HoleCard,
  KitLimits,
  ProposeFix,
  Question,
} from '@rivetside/shared';
import type { UnitOfWork } from '../common/database/unit-of-work.js';
import type { Clock } from '../common/time/clock.js';
import type { BuildEntity } from '../features/builds/build.entity.js';
import type { ChapterEntity } from '../features/chapters/chapter.entity.js';
import type { KitEntity } from '../features/kits/kit.entity.js';
import type { SectionEntity } from '../features/kits/section.entity.js';
import type { TestUser } from './create-account.js';
import { CreateKit } from './create-kit.js';
import type { TestClient } from './start-test-app.js';

/** A chapter at work on a section: a builder with an aircraft and three mentors of the discipline. */
export interface Bench {
  readonly chapter: ChapterEntity;
  readonly kit: KitEntity;
  readonly section: SectionEntity;
  readonly build: BuildEntity;
  readonly builder: TestUser;
  readonly mentors: readonly [TestUser, TestUser, TestUser];
}

/** Two sheets of 0.040 whose holes lie 0.0200 apart, well inside of every edge. AD4, caliper. */
export function aHoleCard(): HoleCard {
  const layer = (name: string, y: number) => ({
    name,
    alloy: '2024-T3 clad' as const,
    thickness: 0.04,
    hole: { shape: 'round' as const, diameter: 0.1285 },
    offset: { x: 0, y },
    edges: [{ distance: 0.4, angle: 270 }],
    bends: [],
  });
  return {
    layers: [layer('spar', 0), layer('doubler', 0.02)],
    rivet: { head: 'universal', alloy: 'AD', dash: 4 },
    neighbours: [{ x: 0.75, y: 0, dash: 4 }],
    access: 'both',
  };
}

/** The same with an edge of 1.2 D in the doubler: outside of published numbers whatever is done. */
export function aHoleCardNearAnEdge(): HoleCard {
  const card = aHoleCard();
  const [spar, doubler] = card.layers;
  return { ...card, layers: [spar!, { ...doubler!, edges: [{ distance: 0.15, angle: 90 }] }] };
}

/** What the kit maker allows on a hole line, edge alone. */
export const KIT_LIMITS: KitLimits = {
  edgeMinimumD: 1.7,
  pitchMinimumD: null,
  holeMaximum: null,
  shopHeadMinimumWidthD: null,
  shopHeadMinimumHeightD: null,
  source: 'Drawing 14 rev B',
};

export function aFix(facts: Partial<ProposeFix> = {}): ProposeFix {
  return {
    kind: 'nextSize',
    summary: 'Ream both layers together, drive the next size',
    operations: [
      { no: 10, text: 'Cleco the row and ream to #21.', caution: 'Eyes and ears.' },
      { no: 20, text: 'Deburr, prime, drive 470 AD5-5.' },
    ],
    conditions: ['Measure the driven head'],
    ...facts,
  };
}

/** Asks, proposes and stamps as people do: through the API, so that every rule has been asked. */
export class CreateQuestion extends CreateKit {
  constructor(
    unitOfWork: UnitOfWork,
    clock: Clock,
    private readonly as: (user: TestUser) => TestClient,
  ) {
    super(unitOfWork, clock);
  }

  async bench({
    critical = false,
    disciplines = ['riveting'] as readonly Discipline[],
  } = {}): Promise<Bench> {
    const chapter = await this.chapter();
    const kit = await this.kit([chapter]);
    const section = await this.section(kit, { critical });
    const builder = await this.user({ chapter, roles: ['builder'] });
    const build = await this.build({ kit, owner: builder, chapter });
    const mentor = (stampNumber: string) =>
      this.user({ chapter, roles: ['mentor'], disciplines, stampNumber });
    const mentors = [await mentor('M-01'), await mentor('M-02'), await mentor('M-03')] as const;
    return { chapter, kit, section, build, builder, mentors };
  }

  asking(bench: Bench, facts: Partial<AskQuestion> = {}): AskQuestion {
    return {
      kitId: bench.kit.id,
      sectionId: bench.section.id,
      chapterId: bench.chapter.id,
      audience: 'chapter',
      discipline: 'riveting',
      mishap: 'misalignedHole',
      title: 'Hole 7 does not line up with the doubler',
      body: 'Matched them this evening; a #40 pin will not go in.',
      holeCard: aHoleCard(),
      ...facts,
    };
  }

  async question(bench: Bench, facts: Partial<AskQuestion> = {}): Promise<Question> {
    const { body } = await this.as(bench.builder)
      .post('/questions')
      .send(this.asking(bench, facts))
      .expect(201);
    return body as Question;
  }

  async fix(mentor: TestUser, question: { id: string }, facts: Partial<ProposeFix> = {}): Promise<Fix> {
    const { body } = await this.as(mentor)
      .post(`/questions/${question.id}/fixes`)
      .send(aFix(facts))
      .expect(201);
    return body as Fix;
  }

  async stamp(mentor: TestUser, fix: { id: string }, facts: EndorseInput = {}): Promise<Endorsement> {
    const { body } = await this.as(mentor).post(`/fixes/${fix.id}/endorsements`).send(facts).expect(201);
    return body as Endorsement;
  }
}

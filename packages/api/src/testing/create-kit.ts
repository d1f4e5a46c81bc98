import { newId } from '../common/ids.js';
import { BuildCrewEntity } from '../features/builds/build-crew.entity.js';
import { BuildEntity } from '../features/builds/build.entity.js';
import type { ChapterEntity } from '../features/chapters/chapter.entity.js';
import { HoleLineEntity } from '../features/kits/hole-line.entity.js';
import { KitChapterEntity } from '../features/kits/kit-chapter.entity.js';
import { KitEntity } from '../features/kits/kit.entity.js';
import { PartEntity } from '../features/kits/part.entity.js';
import { SectionEntity } from '../features/kits/section.entity.js';
import { StepEntity } from '../features/kits/step.entity.js';
import { CreateAccount } from './create-account.js';

let counted = 0;
const next = () => (counted += 1);

/** Makes kits, their places and the aircraft built from them; what a row needs is made with it unless given. */
export class CreateKit extends CreateAccount {
  /** A kit that the chapters build. */
  async kit(chapters: readonly { id: string }[], facts: Partial<KitEntity> = {}): Promise<KitEntity> {
    const kit = Object.assign(new KitEntity(), {
      id: newId(),
      name: 'Test kit',
      maker: 'Nobody',
      kind: 'two seats',
      ...facts,
    });
    await this.insert(KitEntity, kit);
    for (const chapter of chapters) await this.link(kit, chapter);
    return kit;
  }

  /** One more chapter builds the kit. */
  link(kit: { id: string }, chapter: { id: string }): Promise<void> {
    return this.insert(KitChapterEntity, { kitId: kit.id, chapterId: chapter.id });
  }

  async section(kit: { id: string }, facts: Partial<SectionEntity> = {}): Promise<SectionEntity> {
    const number = next();
    const section = Object.assign(new SectionEntity(), {
      id: newId(),
      kitId: kit.id,
      code: `S${number}`,
      name: `Section ${number}`,
      position: number,
      critical: false,
      regions: ['L-stab', 'R-stab'],
      stewardId: null,
      ...facts,
    });
    await this.insert(SectionEntity, section);
    return section;
  }

  async step(section: SectionEntity, facts: Partial<StepEntity> = {}): Promise<StepEntity> {
    const number = next();
    const step = Object.assign(new StepEntity(), {
      id: newId(),
      sectionId: section.id,
      number,
      code: `${section.code}.${number}`,
      title: `Step ${number}`,
      work: 'assemble' as const,
      estimateHours: 2,
      twoPerson: false,
      closesStructure: false,
      hazard: null,
      ...facts,
    });
    await this.insert(StepEntity, step);
    return step;
  }

  async part(section: SectionEntity, facts: Partial<PartEntity> = {}): Promise<PartEntity> {
    const number = next();
    const part = Object.assign(new PartEntity(), {
      id: newId(),
      kitId: section.kitId,
      sectionId: section.id,
      number: `${section.code}/pt-${number}`,
      name: `Part ${number}`,
      alloy: '2024-T3 clad',
      thickness: 0.04,
      quantity: 1,
      hands: null,
      ...facts,
    });
    await this.insert(PartEntity, part);
    return part;
  }

  async holeLine(section: SectionEntity, facts: Partial<HoleLineEntity> = {}): Promise<HoleLineEntity> {
    const number = next();
    const line = Object.assign(new HoleLineEntity(), {
      id: newId(),
      kitId: section.kitId,
      sectionId: section.id,
      stepId: null,
      code: `HL-${section.code}-${number}`,
      title: `Line ${number}`,
      stack: [],
      head: 'universal' as const,
      alloy: 'AD',
      dash: 4,
      lengthDash: 4.5,
      callOut: '470 AD4-4.5',
      drill: '#30',
      holeDiameter: 0.1285,
      pitch: 0.625,
      edge: 0.3125,
      count: 22,
      repeats: 2,
      drive: null,
      revision: 'B',
      limits: null,
      ...facts,
    });
    await this.insert(HoleLineEntity, line);
    return line;
  }

  async build(
    facts: { kit: { id: string }; owner: { id: string }; chapter: ChapterEntity } & Partial<BuildEntity>,
  ): Promise<BuildEntity> {
    const { kit, owner, chapter, ...rest } = facts;
    const build = Object.assign(new BuildEntity(), {
      id: newId(),
      kitId: kit.id,
      serial: 100 + next(),
      ownerId: owner.id,
      chapterId: chapter.id,
      mentorId: null,
      ruleProfile: 'test',
      startedOn: '2025-03-01',
      ...rest,
    });
    await this.insert(BuildEntity, build);
    return build;
  }

  /** Somebody helps on an aircraft. */
  crew(build: { id: string }, user: { id: string }): Promise<void> {
    return this.insert(BuildCrewEntity, { buildId: build.id, userId: user.id });
  }
}

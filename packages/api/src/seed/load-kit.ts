import type { Tx } from '../common/database/unit-of-work.js';
import { HoleLineEntity } from '../features/kits/hole-line.entity.js';
import { KitChapterEntity } from '../features/kits/kit-chapter.entity.js';
import { KitEntity } from '../features/kits/kit.entity.js';
import { PartEntity } from '../features/kits/part.entity.js';
import { SectionEntity } from '../features/kits/section.entity.js';
import { StepEntity } from '../features/kits/step.entity.js';
import { NoticeEntity } from '../features/notices/notice.entity.js';
import type { SearchDoc, SearchIndexService } from '../features/search/search-index.service.js';
import type { SeedKeys } from './seed-keys.js';
import type { SeedWorld } from './seed-world.js';

export interface Loading {
  readonly tx: Tx;
  readonly world: SeedWorld;
  readonly keys: SeedKeys;
  readonly index: SearchIndexService;
}

const find = ({ tx, index }: Loading, doc: SearchDoc) => index.addIn(tx, doc);

/** The kit with its sections, steps, parts, hole lines and notices, each to be found by its words. */
export async function loadKit(loading: Loading): Promise<void> {
  const { tx, world, keys } = loading;
  const { key, ...kit } = world.kit;
  const kitId = keys.give('kit', key);
  await tx.manager.insert(KitEntity, { id: kitId, ...kit });
  for (const chapter of world.chapters)
    await tx.manager.insert(KitChapterEntity, { kitId, chapterId: keys.of('chapter', chapter.key) });
  await loadSections(loading, kitId);
  await loadParts(loading, kitId);
  await loadHoleLines(loading, kitId);
  await loadNotices(loading, kitId);
}

async function loadSections(loading: Loading, kitId: string): Promise<void> {
  const { tx, world, keys } = loading;
  for (const [at, { steps, steward, ...section }] of world.sections.entries()) {
    const id = keys.give('section', section.code);
    const stewardId = keys.of('person', steward);
    await tx.manager.insert(SectionEntity, { ...section, id, kitId, position: at + 1, stewardId });
    await find(loading, { kind: 'section', refId: id, kitId, title: section.name, place: section.code });
    for (const step of steps) {
      const stepId = keys.give('step', step.code);
      await tx.manager.insert(StepEntity, { ...step, id: stepId, sectionId: id });
      const place = `${step.code} ${section.name}`;
      await find(loading, { kind: 'step', refId: stepId, kitId, title: step.title, place });
    }
  }
}

async function loadParts(loading: Loading, kitId: string): Promise<void> {
  const { tx, world, keys } = loading;
  for (const { section, form: _form, ...part } of world.parts) {
    const id = keys.give('part', part.number);
    await tx.manager.insert(PartEntity, { ...part, id, kitId, sectionId: keys.of('section', section) });
    const words = `${part.alloy} ${part.thickness}`;
    await find(loading, { kind: 'part', refId: id, kitId, title: part.name, place: part.number, words });
  }
}

async function loadHoleLines(loading: Loading, kitId: string): Promise<void> {
  const { tx, world, keys } = loading;
  for (const { section, step, stack, structure: _structure, ...line } of world.holeLines) {
    const id = keys.give('holeLine', line.code);
    await tx.manager.insert(HoleLineEntity, {
      ...line,
      id,
      kitId,
      sectionId: keys.of('section', section),
      stepId: keys.of('step', step),
      stack: stack.map((number) => keys.of('part', number)),
    });
    const words = `${line.callOut} ${line.drill} ${line.holeDiameter} ${stack.join(' ')}`;
    await find(loading, { kind: 'holeLine', refId: id, kitId, title: line.title, place: line.code, words });
  }
}

async function loadNotices(loading: Loading, kitId: string): Promise<void> {
  const { tx, world, keys } = loading;
  for (const { sections, parts, holeLines, reason: _reason, ...notice } of world.notices) {
    const id = keys.give('notice', notice.number);
    const touched = { sectionCodes: sections, partNumbers: parts, holeLineCodes: holeLines };
    await tx.manager.insert(NoticeEntity, { ...notice, ...touched, id, kitId });
    const place = [notice.number, ...sections, ...parts, ...holeLines].join(' ');
    await find(loading, { kind: 'notice', refId: id, kitId, title: notice.title, place, words: notice.text });
  }
}

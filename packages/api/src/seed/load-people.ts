import { UserEntity } from '../features/accounts/user.entity.js';
import { BuildCrewEntity } from '../features/builds/build-crew.entity.js';
import { BuildEntity } from '../features/builds/build.entity.js';
import { OpenItemEntity } from '../features/builds/open-item.entity.js';
import { StepProgressEntity } from '../features/builds/step-progress.entity.js';
import { ChapterEntity } from '../features/chapters/chapter.entity.js';
import { MembershipEntity } from '../features/chapters/membership.entity.js';
import { newId } from '../common/ids.js';
import type { Loading } from './load-kit.js';
import { STORY_ENDS_ON } from './seed-world.js';

/** The seed files give days; the rows hold instants. */
export const atNoon = (day: string) => `${day}T12:00:00.000Z`;

export async function loadPeople({ tx, world, keys }: Loading, passwordHash: string): Promise<void> {
  for (const { key, foundedOn, ruleProfile: _rules, cribKeeper: _keeper, ...chapter } of world.chapters) {
    const id = keys.give('chapter', key);
    await tx.manager.insert(ChapterEntity, { ...chapter, id, key, createdAt: atNoon(foundedOn) });
  }
  for (const { key, name, email, siteRole, units, zone, joinedOn, membership } of world.people) {
    const userId = keys.give('person', key);
    const at = atNoon(joinedOn);
    const account = { name, email, siteRole, units, zone, passwordHash };
    await tx.manager.insert(UserEntity, {
      ...account,
      id: userId,
      emailConfirmedAt: at,
      disabledAt: null,
      createdAt: at,
    });
    if (!membership) continue;
    const { chapter, roles, disciplines, stampNumber } = membership;
    const chapterId = keys.of('chapter', chapter);
    const standing = { roles, disciplines, stampNumber, status: 'active' as const, joinedAt: at };
    await tx.manager.insert(MembershipEntity, { id: newId(), chapterId, userId, ...standing });
  }
}

export async function loadBuilds({ tx, world, keys }: Loading): Promise<void> {
  const kitId = keys.of('kit', world.kit.key);
  for (const {
    key,
    serial,
    owner,
    crew,
    chapter,
    mentor,
    ruleProfile,
    startedOn,
    progress,
  } of world.builds) {
    const id = keys.give('build', key);
    await tx.manager.insert(BuildEntity, {
      id,
      kitId,
      serial,
      ownerId: keys.of('person', owner),
      chapterId: keys.of('chapter', chapter),
      mentorId: keys.maybe('person', mentor),
      ruleProfile,
      startedOn,
    });
    for (const helper of crew)
      await tx.manager.insert(BuildCrewEntity, { buildId: id, userId: keys.of('person', helper) });
    const at = atNoon(STORY_ENDS_ON);
    const steps = Object.entries(progress).map(([code, state]) => ({
      buildId: id,
      stepId: keys.of('step', code),
      state,
      at,
    }));
    if (steps.length > 0) await tx.manager.insert(StepProgressEntity, steps);
  }
}

/** After the questions: an item may come from one. */
export async function loadOpenItems({ tx, world, keys }: Loading): Promise<void> {
  for (const { build, section, question, text, due, raisedOn, cleared } of world.openItems)
    await tx.manager.insert(OpenItemEntity, {
      id: newId(),
      buildId: keys.of('build', build),
      sectionId: keys.of('section', section),
      questionId: keys.maybe('question', question),
      text,
      due,
      raisedAt: atNoon(raisedOn),
      clearedAt: cleared ? atNoon(cleared.on) : null,
      clearedById: cleared ? keys.of('person', cleared.by) : null,
      clearedNote: cleared?.note ?? null,
    });
}

import { fitCheck, headlineTrouble, type HoleCard } from '@rivetside/shared';
import { wall } from '../features/questions/question-door.service.js';
import { QuestionNumberEntity } from '../features/questions/question-number.entity.js';
import { QuestionEntity } from '../features/questions/question.entity.js';
import type { Loading } from './load-kit.js';
import { hangPhotos } from './load-photos.js';
import type { SeedQuestion } from './seed.schema.js';
import { happeningsOf } from './story.js';
import { personOf, type Telling } from './telling.js';

/** Every question, told from its asking to its end in the order in which things happened. */
export async function loadQuestions(telling: Telling): Promise<void> {
  const lastOf = new Map<string, number>();
  for (const seed of telling.world.questions) {
    const question = await ask(telling, seed);
    for (const { at, happen } of happeningsOf(telling, seed, question)) {
      telling.clock.standAt(at);
      await happen();
    }
    const [code, last] = seed.number.split('-Q-') as [string, string];
    lastOf.set(code, Math.max(lastOf.get(code) ?? 0, Number(last)));
  }
  const kitId = telling.keys.of('kit', telling.world.kit.key);
  for (const [code, last] of lastOf)
    await telling.tx.manager.insert(QuestionNumberEntity, { kitId, code, last });
}

async function ask(telling: Telling, seed: SeedQuestion): Promise<QuestionEntity> {
  const { tx, keys, clock, log, index, world } = telling;
  const at = clock.standAt(seed.askedAt);
  const by = personOf(telling, seed.askedBy);
  const question = Object.assign(new QuestionEntity(), placed(telling, seed), {
    id: keys.give('question', seed.key),
    number: seed.number,
    kitId: keys.of('kit', world.kit.key),
    chapterId: keys.of('chapter', seed.chapter),
    buildId: keys.of('build', seed.build),
    askedById: by.id,
    askedAt: at,
    state: 'open' as const,
    waitsFor: 'firstFix' as const,
    waitsSince: at,
    lastSeq: 0,
    lastActivityAt: at,
    withdrawnAt: null,
    withdrawnReason: null,
  });
  await tx.manager.insert(QuestionEntity, question);
  await hangPhotos(telling, {
    photos: telling.photos,
    question: seed,
    ownerId: by.id,
    at,
    usedIn: 'question',
  });
  await log.append(tx, question, { type: 'asked', by, data: {} });
  const { id, kitId, title, body } = question;
  const place = [seed.number, sectionName(telling, seed), ...seed.parts, seed.holeLine]
    .filter(Boolean)
    .join(' ');
  await index.addIn(tx, {
    kind: 'question',
    refId: id,
    questionId: id,
    kitId,
    chapterId: wall(question),
    title,
    place,
    words: body,
  });
  return question;
}

function sectionName({ world }: Loading, { section }: SeedQuestion): string {
  return world.sections.find(({ code }) => code === section)?.name ?? '';
}

/** Pinned and checked with what the app itself checks with. */
function placed({ keys }: Loading, seed: SeedQuestion) {
  const { section, step, part, holeLine, holes, audience, discipline, mishap, title, body } = seed;
  const holeCard = seed.holeCard ? cardWithIds(seed.holeCard, (number) => keys.of('part', number)) : null;
  const check = holeCard ? fitCheck(holeCard) : null;
  return {
    sectionId: keys.maybe('section', section),
    stepId: keys.maybe('step', step),
    partId: keys.maybe('part', part),
    holeLineId: keys.maybe('holeLine', holeLine),
    holes,
    audience,
    discipline,
    mishap,
    title,
    body,
    holeCard,
    fitCheck: check,
    headline: check ? headlineTrouble(mishap, check) : null,
  };
}

function cardWithIds(card: HoleCard, idOf: (number: string) => string): HoleCard {
  const layers = card.layers.map((layer) => ({ ...layer, partId: layer.partId ? idOf(layer.partId) : null }));
  return { ...card, layers };
}

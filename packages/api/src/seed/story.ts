import {
  asDoneCheck,
  ENGINE_VERSION,
  type Endorsement,
  type Fix,
  fitCheck,
  type Objection,
  type Person,
} from '@rivetside/shared';
import { newId } from '../common/ids.js';
import { EntryEntity } from '../features/builds/entry.entity.js';
import { FixEntity } from '../features/fixes/fix.entity.js';
import { ObjectionEntity } from '../features/fixes/objection.entity.js';
import { conditionsOf, entryLines } from '../features/questions/completion-entry.js';
import { CompletionEntity } from '../features/questions/completion.entity.js';
import { wall } from '../features/questions/question-door.service.js';
import type { QuestionEntity } from '../features/questions/question.entity.js';
import { ReferralEntity } from '../features/questions/referral.entity.js';
import { hangPhotos } from './load-photos.js';
import { personOf, say, type Telling } from './telling.js';
import type { SeedFix, SeedQuestion, SeedStamp } from './seed.schema.js';
import { StampStory } from './stamp-story.js';

/** Something that happened on a sheet: when, and how it is written down. */
export interface Happening {
  readonly at: string;
  happen(): Promise<void>;
}

type SeedObjection = SeedFix['objections'][number];
type Kind = Parameters<Telling['log']['append']>[2]['type'];

/** What happened under one question after its asking, in order. */
export function happeningsOf(telling: Telling, seed: SeedQuestion, question: QuestionEntity): Happening[] {
  const story = new Story(telling, seed, question);
  const all = [
    ...seed.talk.map((line) => ({ at: line.at, happen: () => say(telling, question, line) })),
    ...seed.fixes.flatMap((fix) => story.ofFix(fix)),
    ...story.ofReferral(),
    ...story.ofCompletion(),
  ];
  return all.sort((one, other) => Date.parse(one.at) - Date.parse(other.at));
}

class Story {
  /** As a reader of the sheet would have seen them so far. */
  private readonly fixes = new Map<number, Fix>();

  constructor(
    private readonly telling: Telling,
    private readonly seed: SeedQuestion,
    private readonly question: QuestionEntity,
  ) {}

  ofFix(fix: SeedFix): Happening[] {
    const { withdrawn } = fix;
    return [
      { at: fix.at, happen: () => this.propose(fix) },
      ...fix.endorsements.flatMap((stamp) => this.ofStamp(fix, stamp)),
      ...fix.objections.flatMap((objection) => this.ofObjection(fix, objection)),
      ...(withdrawn ? [{ at: withdrawn.at, happen: () => this.withdrawFix(fix, withdrawn.reason) }] : []),
    ];
  }

  ofReferral(): Happening[] {
    const { referral } = this.seed;
    if (!referral) return [];
    const id = newId();
    const by = this.person(referral.by);
    const asked = { id, questionId: this.question.id, byId: by.id, note: referral.note };
    const shown = () => ({
      id,
      at: new Date(referral.at).toISOString(),
      by,
      note: referral.note,
      answered: null,
    });
    const refer = async () => {
      const unanswered = { answeredAt: null, answeredById: null, answer: null, reference: null };
      await this.tx.manager.insert(ReferralEntity, { ...asked, at: this.now(), ...unanswered });
      await this.tell('referral', by, { referral: shown() });
    };
    const { answer } = referral;
    if (!answer) return [{ at: referral.at, happen: refer }];
    const file = async () => {
      const answerer = this.person(answer.by);
      const at = this.now();
      const { reference } = answer;
      const facts = { answeredAt: at, answeredById: answerer.id, answer: answer.answer, reference };
      await this.tx.manager.update(ReferralEntity, { id }, facts);
      const answered = { at, by: answerer, answer: answer.answer, reference };
      await this.tell('referralAnswer', answerer, { referral: { ...shown(), answered } });
    };
    return [
      { at: referral.at, happen: refer },
      { at: answer.at, happen: file },
    ];
  }

  ofCompletion(): Happening[] {
    const { completion } = this.seed;
    return completion ? [{ at: completion.at, happen: () => this.carryOut(completion) }] : [];
  }

  private ofStamp(fix: SeedFix, seed: SeedStamp): Happening[] {
    const stamp = new StampStory(this.telling, seed, this.question);
    const show = (endorsement: Endorsement) => this.replaceStamp(fix, endorsement);
    const tell = async (type: Kind, by: string, endorsement: Endorsement) => {
      show(endorsement);
      await this.tell(type, this.person(by), { endorsement });
    };
    const { held, withdrawn, reviews } = seed;
    return [
      { at: seed.at, happen: async () => tell('endorsement', seed.by, await stamp.give(this.fix(fix).id)) },
      ...(held
        ? [{ at: held.at, happen: async () => tell('endorsementHeld', held.by, await stamp.hold(held)) }]
        : []),
      ...reviews.map((review) => ({
        at: review.at,
        happen: async () => tell('endorsementReviewed', review.by, await stamp.review(review)),
      })),
      ...(withdrawn
        ? [
            {
              at: withdrawn.at,
              happen: async () =>
                tell('endorsementWithdrawn', withdrawn.by, await stamp.withdraw(withdrawn.reason)),
            },
          ]
        : []),
    ];
  }

  private ofObjection(fix: SeedFix, seed: SeedObjection): Happening[] {
    const id = newId();
    const by = this.person(seed.by);
    const { answer } = seed;
    const shown = (answered: Objection['answered']): Objection => ({
      id,
      fixId: this.fix(fix).id,
      by,
      at: new Date(seed.at).toISOString(),
      reason: seed.reason,
      answered,
    });
    const object = async () => {
      const unanswered = { answeredAt: null, answeredById: null, answer: null };
      const row = { id, fixId: this.fix(fix).id, byId: by.id, at: this.now(), reason: seed.reason };
      await this.tx.manager.insert(ObjectionEntity, { ...row, ...unanswered });
      await this.tell('objection', by, { objection: shown(null) });
    };
    if (!answer) return [{ at: seed.at, happen: object }];
    const reply = async () => {
      const answerer = this.person(answer.by);
      const at = this.now();
      await this.tx.manager.update(
        ObjectionEntity,
        { id },
        { answeredAt: at, answeredById: answerer.id, answer: answer.text },
      );
      await this.tell('objectionAnswered', answerer, {
        objection: shown({ at, by: answerer, answer: answer.text }),
      });
    };
    return [
      { at: seed.at, happen: object },
      { at: answer.at, happen: reply },
    ];
  }

  private async propose(seed: SeedFix): Promise<void> {
    const { holeCard } = this.question;
    const check = holeCard
      ? (fitCheck(holeCard).remedies.find(({ kind }) => kind === seed.kind) ?? null)
      : null;
    const by = this.person(seed.by);
    const { number, kind, summary, operations, conditions } = seed;
    const facts = {
      id: newId(),
      questionId: this.question.id,
      number,
      kind,
      summary,
      operations,
      conditions,
    };
    const checked = { holeCard: null, check, engineVersion: check ? ENGINE_VERSION : null, at: this.now() };
    const row = { ...facts, ...checked, byId: by.id, withdrawnAt: null, withdrawnReason: null };
    await this.tx.manager.insert(FixEntity, row as FixEntity);
    const fix: Fix = { ...facts, ...checked, by, withdrawn: null, endorsements: [], objections: [] };
    this.fixes.set(number, fix);
    await this.tell('fix', by, { fix });
    const words = [...operations.map(({ text }) => text), ...conditions].join(' ');
    const { id: questionId, kitId } = this.question;
    const where = { questionId, kitId, chapterId: wall(this.question) };
    await this.telling.index.addIn(this.tx, { kind: 'fix', refId: fix.id, ...where, title: summary, words });
  }

  private async withdrawFix(seed: SeedFix, reason: string): Promise<void> {
    const at = this.now();
    const fix = { ...this.fix(seed), withdrawn: { at, reason } };
    this.fixes.set(seed.number, fix);
    await this.tx.manager.update(FixEntity, { id: fix.id }, { withdrawnAt: at, withdrawnReason: reason });
    await this.tell('fixWithdrawn', fix.by, { fix });
  }

  private async carryOut(seed: NonNullable<SeedQuestion['completion']>): Promise<void> {
    const fix = this.fixes.get(seed.fix)!;
    const by = this.person(seed.by);
    const { asDone, minutes, conditionsMet, helpers, used, note } = seed;
    const { holeCard } = this.question;
    const conditionsLeft = conditionsOf(fix).filter((condition) => !conditionsMet.includes(condition));
    const check = holeCard ? asDoneCheck(holeCard, asDone, fix.check) : null;
    const at = this.now();
    const done = { asDone, minutes, conditionsMet, conditionsLeft, helpers, note, check };
    const id = newId();
    const entryId = newId();
    const { sectionId, stepId, id: questionId, title } = this.question;
    const lines = entryLines({ title }, fix, done);
    if (used.length > 0) lines.push({ label: 'Used', text: used.join('; ') });
    const where = { buildId: this.question.buildId!, kind: 'fix' as const, sectionId, stepId, questionId };
    const written = { photoIds: [], doneAt: at, writtenAt: at, byId: by.id, minutes, helpers };
    await this.tx.manager.insert(EntryEntity, {
      id: entryId,
      ...where,
      title: fix.summary,
      lines,
      ...written,
    });
    await this.tx.manager.insert(CompletionEntity, {
      id,
      questionId,
      fixId: fix.id,
      ...done,
      byId: by.id,
      at,
      entryId,
    } as CompletionEntity);
    const { photos } = this.telling;
    await hangPhotos(this.telling, { photos, question: this.seed, ownerId: by.id, at, usedIn: id });
    const completion = { id, fixId: fix.id, ...done, by, at, entryId, photos: [] };
    await this.tell('completion', by, { completion });
  }

  private replaceStamp(seed: SeedFix, endorsement: Endorsement): void {
    const fix = this.fix(seed);
    const others = fix.endorsements.filter(({ id }) => id !== endorsement.id);
    this.fixes.set(seed.number, { ...fix, endorsements: [...others, endorsement] });
  }

  private fix({ number }: SeedFix): Fix {
    return this.fixes.get(number)!;
  }

  private person(key: string): Person {
    return personOf(this.telling, key);
  }

  private async tell(type: Kind, by: Person, data: Record<string, unknown>): Promise<void> {
    await this.telling.log.append(this.tx, this.question, { type, by, data });
  }

  private now(): string {
    return this.telling.clock.instant();
  }

  private get tx() {
    return this.telling.tx;
  }
}

import { hash } from '@node-rs/argon2';
import type { ChapterRole, Discipline, SiteRole, Units } from '@rivetside/shared';
import type { UnitOfWork } from '../common/database/unit-of-work.js';
import { newId } from '../common/ids.js';
import type { Clock } from '../common/time/clock.js';
import { SessionEntity } from '../features/accounts/session.entity.js';
import { UserEntity } from '../features/accounts/user.entity.js';
import { ChapterEntity } from '../features/chapters/chapter.entity.js';
import { MembershipEntity } from '../features/chapters/membership.entity.js';

/** Somebody with a live session, so that `test.as(user)` needs no password. */
export interface TestUser {
  readonly id: string;
  readonly email: string;
  readonly name: string;
  readonly sessionId: string;
}

export interface UserFacts {
  readonly name?: string;
  readonly email?: string;
  readonly units?: Units;
  readonly siteRole?: SiteRole;
  /** Signs in by this password too; without it only by `as`. */
  readonly password?: string;
  readonly disabledAt?: string;
  readonly emailConfirmedAt?: string | null;
  /** Member of this chapter; where only roles are given, of a new one. */
  readonly chapter?: { readonly id: string };
  readonly roles?: readonly ChapterRole[];
  readonly disciplines?: readonly Discipline[];
  readonly status?: MembershipEntity['status'];
  readonly stampNumber?: string;
}

/** Matches no password. */
const NO_PASSWORD = 'no password';
/** As little work as argon2 does: what a hash costs is tested elsewhere. */
const CHEAP = { memoryCost: 8, timeCost: 1, parallelism: 1 };

/** Makes chapters and people; each stands alone unless told otherwise. */
export class CreateAccount {
  private made = 0;

  constructor(
    protected readonly unitOfWork: UnitOfWork,
    protected readonly clock: Clock,
  ) {}

  protected async insert<T extends object>(entity: new () => T, row: T): Promise<void> {
    await this.unitOfWork.run((tx) => tx.manager.insert(entity, row as never));
  }

  async chapter(facts: Partial<ChapterEntity> = {}): Promise<ChapterEntity> {
    const number = (this.made += 1);
    const chapter = Object.assign(new ChapterEntity(), {
      id: newId(),
      key: `T${number}`,
      name: `Chapter ${number}`,
      zone: 'Europe/London',
      currency: 'GBP',
      meets: 'First Tuesday, 19:00',
      place: 'Hangar 3',
      joining: 'approval' as const,
      createdAt: this.clock.instant(),
      ...facts,
    });
    await this.unitOfWork.run((tx) => tx.manager.insert(ChapterEntity, chapter));
    return chapter;
  }

  async user(facts: UserFacts = {}): Promise<TestUser> {
    const at = this.clock.instant();
    const passwordHash = facts.password === undefined ? NO_PASSWORD : await hash(facts.password, CHEAP);
    const user = Object.assign(userOf(facts, (this.made += 1), at), { passwordHash });
    const sessionId = newId();
    const session = { id: sessionId, userId: user.id, device: 'test', createdAt: at, lastUsedAt: at };
    await this.unitOfWork.run(async (tx) => {
      await tx.manager.insert(UserEntity, user);
      await tx.manager.insert(SessionEntity, { ...session, endedAt: null, endedReason: null });
    });
    if (facts.chapter ?? facts.roles) await this.member(user, facts);
    return { id: user.id, email: user.email, name: user.name, sessionId };
  }

  /** Makes somebody a member of one more chapter. */
  async member(user: { readonly id: string }, facts: UserFacts = {}): Promise<MembershipEntity> {
    const chapterId = facts.chapter?.id ?? (await this.chapter()).id;
    const membership = Object.assign(new MembershipEntity(), {
      id: newId(),
      chapterId,
      userId: user.id,
      roles: [...(facts.roles ?? ['builder'])],
      disciplines: [...(facts.disciplines ?? [])],
      status: facts.status ?? ('active' as const),
      stampNumber: facts.stampNumber ?? null,
      joinedAt: this.clock.instant(),
    });
    await this.unitOfWork.run((tx) => tx.manager.insert(MembershipEntity, membership));
    return membership;
  }
}

function userOf(facts: UserFacts, number: number, at: string): UserEntity {
  return Object.assign(new UserEntity(), {
    id: newId(),
    email: facts.email ?? `person${number}@test.example`,
    name: facts.name ?? `Person ${number}`,
    emailConfirmedAt: facts.emailConfirmedAt === undefined ? at : facts.emailConfirmedAt,
    units: facts.units ?? ('inch' as const),
    zone: 'Europe/London',
    siteRole: facts.siteRole ?? null,
    disabledAt: facts.disabledAt ?? null,
    createdAt: at,
  });
}

import { z } from 'zod';
import { type Discipline, disciplineSchema } from '../words/words.js';

/** Everyone a route may be for; `x-roles` of the OpenAPI document lists them. */
export const ROLES = ['guest', 'builder', 'mentor', 'chapterAdmin', 'steward', 'siteAdmin'] as const;
export type Role = (typeof ROLES)[number];

export const CHAPTER_ROLES = ['builder', 'mentor', 'chapterAdmin'] as const;
export const chapterRoleSchema = z.enum(CHAPTER_ROLES);
export type ChapterRole = z.infer<typeof chapterRoleSchema>;

export const siteRoleSchema = z.enum(['steward', 'siteAdmin']).nullable();
export type SiteRole = z.infer<typeof siteRoleSchema>;

export const MEMBERSHIP_STATUSES = ['active', 'requested', 'suspended'] as const;
export const membershipSchema = z
  .strictObject({
    chapterId: z.string(),
    chapterName: z.string(),
    roles: z.array(chapterRoleSchema),
    disciplines: z.array(disciplineSchema),
    status: z.enum(MEMBERSHIP_STATUSES),
  })
  .meta({ id: 'Membership' });
export type Membership = z.infer<typeof membershipSchema>;

/** Whoever is signed in, as every policy sees them. */
export interface Actor {
  readonly id: string;
  readonly name: string;
  readonly sessionId: string;
  readonly siteRole: SiteRole;
  readonly memberships: readonly Membership[];
}

type Standing = Pick<Actor, 'memberships'>;

/** Only an active membership counts for anything. */
function activeIn(actor: Standing, chapterId: string): Membership | undefined {
  return actor.memberships.find((one) => one.chapterId === chapterId && one.status === 'active');
}

export function isMember(actor: Standing, chapterId: string): boolean {
  return activeIn(actor, chapterId) !== undefined;
}

export function isBuilderIn(actor: Standing, chapterId: string): boolean {
  return activeIn(actor, chapterId)?.roles.includes('builder') ?? false;
}

/** A mentor of that chapter who holds the discipline. */
export function isMentorIn(actor: Standing, chapterId: string, discipline: Discipline): boolean {
  const membership = activeIn(actor, chapterId);
  return (
    membership !== undefined &&
    membership.roles.includes('mentor') &&
    membership.disciplines.includes(discipline)
  );
}

export function isChapterAdmin(actor: Standing, chapterId: string): boolean {
  return activeIn(actor, chapterId)?.roles.includes('chapterAdmin') ?? false;
}

export function activeChapterIds(actor: Standing): string[] {
  return actor.memberships.filter(({ status }) => status === 'active').map(({ chapterId }) => chapterId);
}

/** The roles somebody holds anywhere; `guest` for whoever is signed in but holds none. */
export function rolesOf(actor: Pick<Actor, 'memberships' | 'siteRole'>): Role[] {
  const held = new Set<Role>(
    actor.memberships.filter(({ status }) => status === 'active').flatMap(({ roles }) => roles),
  );
  if (actor.siteRole) held.add(actor.siteRole);
  return held.size === 0 ? ['guest'] : [...held];
}

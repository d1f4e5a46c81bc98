import { type Actor, isMember } from '../access/roles.js';

/** Who is in a chapter is known to its members, and to the site admin who mends what its admins cannot. */
export function canSeeMembers(actor: Pick<Actor, 'memberships' | 'siteRole'>, chapterId: string): boolean {
  return isMember(actor, chapterId) || actor.siteRole === 'siteAdmin';
}

import type { Actor, ChapterRole, Membership } from '../access/roles.js';
import { canSeeMembers } from './chapter-policies.js';

const HERE = 'here';

function someone(
  facts: {
    in?: string;
    roles?: ChapterRole[];
    status?: Membership['status'];
    siteRole?: Actor['siteRole'];
  } = {},
): Pick<Actor, 'memberships' | 'siteRole'> {
  const { roles = [], status = 'active', siteRole = null } = facts;
  const membership = { chapterId: facts.in ?? '', chapterName: 'Moss Hill', roles, disciplines: [], status };
  return { siteRole, memberships: facts.in === undefined ? [] : [membership] };
}

describe('canSeeMembers', () => {
  it.each<{ who: string; actor: ReturnType<typeof someone>; may: boolean }>([
    { who: 'whoever is in no chapter', actor: someone(), may: false },
    { who: 'a kit steward who is no member', actor: someone({ siteRole: 'steward' }), may: false },
    {
      who: 'an admin of another chapter',
      actor: someone({ in: 'there', roles: ['chapterAdmin'] }),
      may: false,
    },
    { who: 'whoever has asked to join', actor: someone({ in: HERE, status: 'requested' }), may: false },
    {
      who: 'a suspended admin',
      actor: someone({ in: HERE, roles: ['chapterAdmin'], status: 'suspended' }),
      may: false,
    },
    { who: 'a member without a role', actor: someone({ in: HERE }), may: true },
    { who: 'a builder', actor: someone({ in: HERE, roles: ['builder'] }), may: true },
    { who: 'a mentor', actor: someone({ in: HERE, roles: ['mentor'] }), may: true },
    { who: 'the site admin', actor: someone({ siteRole: 'siteAdmin' }), may: true },
  ])('is $may for $who', ({ actor, may }) => expect(canSeeMembers(actor, HERE)).toBe(may));
});

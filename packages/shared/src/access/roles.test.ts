import {
  activeChapterIds,
  isBuilderIn,
  isChapterAdmin,
  isMember,
  isMentorIn,
  type Membership,
  membershipSchema,
  rolesOf,
} from './roles.js';

const HERE = 'here';
const member = (facts: Partial<Membership> = {}): { memberships: Membership[] } => ({
  memberships: [
    {
      chapterId: HERE,
      chapterName: 'Moss Hill',
      roles: ['builder', 'mentor', 'chapterAdmin'],
      disciplines: ['riveting'],
      status: 'active',
      ...facts,
    },
  ],
});
const all = (actor: { memberships: Membership[] }, chapterId = HERE) => ({
  member: isMember(actor, chapterId),
  builder: isBuilderIn(actor, chapterId),
  mentor: isMentorIn(actor, chapterId, 'riveting'),
  admin: isChapterAdmin(actor, chapterId),
});
const NONE = { member: false, builder: false, mentor: false, admin: false };

describe('standing in a chapter', () => {
  it.each<{ who: string; actor: { memberships: Membership[] }; is: Partial<typeof NONE> }>([
    { who: 'whoever is in no chapter', actor: { memberships: [] }, is: {} },
    { who: 'whoever has asked to join', actor: member({ status: 'requested' }), is: {} },
    { who: 'a suspended member', actor: member({ status: 'suspended' }), is: {} },
    { who: 'a member without a role', actor: member({ roles: [] }), is: { member: true } },
    { who: 'a builder', actor: member({ roles: ['builder'] }), is: { member: true, builder: true } },
    { who: 'a mentor', actor: member({ roles: ['mentor'] }), is: { member: true, mentor: true } },
    {
      who: 'a mentor of another discipline',
      actor: member({ roles: ['mentor'], disciplines: ['engine'] }),
      is: { member: true },
    },
    {
      who: 'a builder with a discipline',
      actor: member({ roles: ['builder'] }),
      is: { member: true, builder: true },
    },
    { who: 'a chapter admin', actor: member({ roles: ['chapterAdmin'] }), is: { member: true, admin: true } },
  ])('of $who', ({ actor, is }) => expect(all(actor)).toEqual({ ...NONE, ...is }));

  it('counts for nothing in another chapter', () => expect(all(member(), 'there')).toEqual(NONE));
});

describe('activeChapterIds', () => {
  it('lists where somebody is an active member', () => {
    const memberships = [
      ...member().memberships,
      ...member({ chapterId: 'asked', status: 'requested' }).memberships,
      ...member({ chapterId: 'out', status: 'suspended' }).memberships,
      ...member({ chapterId: 'there' }).memberships,
    ];
    expect(activeChapterIds({ memberships })).toEqual([HERE, 'there']);
  });
});

describe('rolesOf', () => {
  it.each([
    { who: 'nobody in particular', actor: { memberships: [], siteRole: null }, roles: ['guest'] },
    { who: 'a member without a role', actor: { ...member({ roles: [] }), siteRole: null }, roles: ['guest'] },
    {
      who: 'a suspended mentor',
      actor: { ...member({ status: 'suspended' }), siteRole: null },
      roles: ['guest'],
    },
    { who: 'a kit steward', actor: { memberships: [], siteRole: 'steward' as const }, roles: ['steward'] },
    {
      who: 'a site admin who builds',
      actor: { ...member({ roles: ['builder'] }), siteRole: 'siteAdmin' as const },
      roles: ['builder', 'siteAdmin'],
    },
  ])('of $who', ({ actor, roles }) => expect(rolesOf(actor)).toEqual(roles));

  it('says each role once, in however many chapters it is held', () => {
    const memberships = [...member().memberships, ...member({ chapterId: 'there' }).memberships];
    expect(rolesOf({ memberships, siteRole: null })).toEqual(['builder', 'mentor', 'chapterAdmin']);
  });
});

describe('membershipSchema', () => {
  it.each([
    { fault: 'an unknown role', change: { roles: ['owner'] } },
    { fault: 'an unknown discipline', change: { disciplines: ['welding'] } },
    { fault: 'an unknown status', change: { status: 'banned' } },
    { fault: 'anything besides', change: { stampNumber: 'M-07' } },
  ])('refuses $fault', ({ change }) => {
    const [membership] = member().memberships;
    expect(membershipSchema.safeParse(membership).success).toBe(true);
    expect(membershipSchema.safeParse({ ...membership, ...change }).success).toBe(false);
  });
});

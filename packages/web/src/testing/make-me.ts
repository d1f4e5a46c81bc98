import type { Me } from '@rivetside/shared';

/** Somebody who builds in the one chapter they belong to, unless the test says otherwise. */
export function makeMe(facts: Partial<Me> = {}): Me {
  return {
    id: '0190a0b0-0000-7000-8000-000000000001',
    name: 'Ottoline Brackwater',
    email: 'builder@demo.rivetside.example',
    units: 'inch',
    zone: 'Europe/London',
    memberships: [
      {
        chapterId: '0190a0b0-0000-7000-8000-0000000000c1',
        chapterName: 'Fenmoor',
        roles: ['builder'],
        disciplines: [],
        status: 'active',
      },
    ],
    siteRole: null,
    ...facts,
  };
}

import type { Build, Entry, OpenItem } from '@rivetside/shared';
import { makeMe } from './make-me';

const me = makeMe();
const BUILD = '0190a0b0-0000-7000-8000-00000000b001';
const STABILISER = '0190a0b0-0000-7000-8000-000000005001';

/** The aircraft of whoever makeMe() makes, unless the test says otherwise. */
export function makeBuild(facts: Partial<Build> = {}): Build {
  return {
    id: BUILD,
    kitId: '0190a0b0-0000-7000-8000-00000000f002',
    kitName: 'Fellwisp Two',
    serial: 141,
    chapterId: me.memberships[0]!.chapterId,
    owner: { id: me.id, name: me.name },
    crew: [],
    mentor: null,
    startedOn: '2024-09-01',
    mine: true,
    ...facts,
  };
}

export function makeOpenItem(facts: Partial<OpenItem> = {}): OpenItem {
  return {
    id: '0190a0b0-0000-7000-8000-000000000001',
    buildId: BUILD,
    sectionId: STABILISER,
    sectionName: 'Stabiliser',
    questionId: null,
    text: 'Right root rib is on back-order',
    due: null,
    raisedAt: '2025-05-20T18:00:00.000Z',
    clearedAt: null,
    clearedNote: null,
    ...facts,
  };
}

export function makeEntry(facts: Partial<Entry> = {}): Entry {
  return {
    id: '0190a0b0-0000-7000-8000-00000000e001',
    buildId: BUILD,
    kind: 'fix',
    sectionId: STABILISER,
    sectionName: 'Stabiliser',
    questionId: '0190a0b0-0000-7000-8000-00000000a014',
    questionNumber: 'STB-Q-014',
    title: 'Next rivet size in hole 7 of the doubler',
    lines: [
      { label: 'found', text: 'Hole 7 off by 0.027' },
      { label: 'did', text: 'Opened to #21, one AD5' },
    ],
    minutes: 65,
    by: { id: me.id, name: me.name },
    helpers: ['Wilf'],
    doneAt: '2025-05-16T19:30:00.000Z',
    writtenAt: '2025-05-16T20:00:00.000Z',
    photoCount: 2,
    ...facts,
  };
}

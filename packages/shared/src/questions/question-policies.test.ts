import type { Actor, ChapterRole, SiteRole } from '../access/roles.js';
import type { Discipline } from '../words/words.js';
import {
  canAnswerObjection,
  canAskIn,
  canCarryOut,
  canEndorse,
  canObject,
  canProposeFix,
  canRefer,
  canReviewStamp,
  canSeeQuestion,
  canTalk,
  canWithdrawFix,
  canWithdrawQuestion,
  canWithdrawStamp,
  hasDesk,
  type QuestionStanding,
  takesAdvice,
} from './question-policies.js';

interface Facts {
  chapterId?: string;
  roles?: ChapterRole[];
  disciplines?: Discipline[];
  status?: 'active' | 'requested' | 'suspended';
  siteRole?: SiteRole;
}

function person(id: string, facts: Facts = {}): Actor {
  const {
    chapterId = 'here',
    roles = ['builder'],
    disciplines = [],
    status = 'active',
    siteRole = null,
  } = facts;
  const memberships = siteRole ? [] : [{ chapterId, chapterName: chapterId, roles, disciplines, status }];
  return { id, name: id, sessionId: `session of ${id}`, siteRole, memberships };
}

const mentor = (id: string, facts: Facts = {}) =>
  person(id, { roles: ['mentor'], disciplines: ['riveting'], ...facts });

const people = {
  asker: person('asker'),
  helper: person('helper'),
  neighbour: person('neighbour'),
  proposer: mentor('proposer'),
  mentor: mentor('mentor'),
  painter: mentor('painter', { disciplines: ['corrosion'] }),
  farMentor: mentor('farMentor', { chapterId: 'there' }),
  farther: mentor('farther', { chapterId: 'elsewhere' }),
  suspended: mentor('suspended', { status: 'suspended' }),
  asking: person('asking', { status: 'requested' }),
  admin: person('admin', { roles: ['chapterAdmin'] }),
  steward: person('steward', { siteRole: 'steward' }),
  siteAdmin: person('siteAdmin', { siteRole: 'siteAdmin' }),
};
type Name = keyof typeof people;
const NAMES = Object.keys(people) as Name[];

const ofChapter: QuestionStanding = {
  chapterId: 'here',
  audience: 'chapter',
  kitChapterIds: ['here', 'there'],
  discipline: 'riveting',
  askedById: 'asker',
  builderIds: ['asker', 'helper'],
  state: 'advised',
};
const ofKit: QuestionStanding = { ...ofChapter, audience: 'kit' };
const fix = { byId: 'proposer' };
const stamp = { byId: 'mentor' };

const members: Name[] = ['asker', 'helper', 'neighbour', 'proposer', 'mentor', 'painter', 'admin'];

describe('who may do what with a question', () => {
  it.each<[string, (actor: Actor) => boolean, Name[]]>([
    [
      'see it in its chapter',
      (actor) => canSeeQuestion(actor, ofChapter),
      [...members, 'steward', 'siteAdmin'],
    ],
    [
      'see it when shared with the kit',
      (actor) => canSeeQuestion(actor, ofKit),
      [...members, 'farMentor', 'steward', 'siteAdmin'],
    ],
    ['ask in the chapter', (actor) => canAskIn(actor, 'here'), ['asker', 'helper', 'neighbour']],
    ['talk', (actor) => canTalk(actor, ofChapter), members],
    ['talk when shared with the kit', (actor) => canTalk(actor, ofKit), [...members, 'farMentor']],
    ['propose a fix', (actor) => canProposeFix(actor, ofChapter), ['proposer', 'mentor']],
    [
      'propose a fix when shared with the kit',
      (actor) => canProposeFix(actor, ofKit),
      ['proposer', 'mentor', 'farMentor'],
    ],
    ['stamp the fix', (actor) => canEndorse(actor, ofChapter, fix), ['mentor']],
    ['stamp it when shared with the kit', (actor) => canEndorse(actor, ofKit, fix), ['mentor', 'farMentor']],
    ['object to the fix', (actor) => canObject(actor, ofChapter, fix), ['mentor']],
    ['answer an objection', (actor) => canAnswerObjection(actor, ofChapter), ['proposer', 'mentor']],
    ['withdraw the fix', (actor) => canWithdrawFix(actor, ofChapter, fix), ['proposer']],
    [
      'withdraw the fix once carried out',
      (actor) => canWithdrawFix(actor, { ...ofChapter, state: 'carriedOut' }, fix),
      [],
    ],
    ['withdraw the stamp', (actor) => canWithdrawStamp(actor, stamp), ['mentor', 'steward']],
    ['look at the held stamp again', (actor) => canReviewStamp(actor, stamp), ['mentor']],
    ['carry it out', (actor) => canCarryOut(actor, ofChapter), ['asker', 'helper']],
    ['refer it', (actor) => canRefer(actor, ofChapter), ['asker', 'proposer', 'mentor']],
    ['withdraw it', (actor) => canWithdrawQuestion(actor, ofChapter), ['asker']],
    ['have a desk', hasDesk, ['proposer', 'mentor', 'painter', 'farMentor', 'farther']],
  ])('to %s', (_, policy, allowed) => {
    expect(NAMES.filter((name) => policy(people[name])).sort()).toEqual([...allowed].sort());
  });

  it('lets nobody stamp for an aircraft that they build, mentor or not', () => {
    const both = mentor('helper', { roles: ['builder', 'mentor'] });
    expect(canEndorse(both, ofChapter, fix)).toBe(false);
    expect(canEndorse(both, { ...ofChapter, builderIds: ['asker'] }, fix)).toBe(true);
  });

  it.each([
    ['open', true],
    ['advised', true],
    ['endorsed', true],
    ['referred', true],
    ['underReview', true],
    ['carriedOut', false],
    ['withdrawn', false],
  ] as const)('takes advice while %s: %s', (state, expected) => {
    expect(takesAdvice({ state })).toBe(expected);
  });
});

import type { Desk } from '@rivetside/shared';
import { screen, waitFor, within } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { fakeLive } from '../../testing/fake-live';
import { makeMe } from '../../testing/make-me';
import { makeQuestionRow } from '../../testing/make-question-row';
import { renderRoute } from '../../testing/render-route';
import { server } from '../../testing/server';

const [membership] = makeMe().memberships;
const mentor = makeMe({
  name: 'Imke Vosterlund',
  memberships: [{ ...membership!, roles: ['mentor'], disciplines: ['riveting', 'sheetMetal'] }],
});
const EMPTY: Desk = { firstFix: [], stamp: [], review: [] };
const row = (title: string, facts = {}) => makeQuestionRow({ id: title, title, ...facts });

function desk(answer: () => Desk | Response) {
  let asked = 0;
  server.use(
    http.get('*/api/builds', () => HttpResponse.json({ items: [], nextCursor: null })),
    http.get('*/api/desk', () => {
      asked += 1;
      const said = answer();
      return said instanceof Response ? said : HttpResponse.json(said);
    }),
  );
  return () => asked;
}
const titlesIn = (label: string) =>
  within(screen.getByRole('list', { name: label }))
    .getAllByRole('heading')
    .map(({ textContent }) => textContent);

beforeEach(() => void fakeLive());
afterEach(() => jest.restoreAllMocks());

it('racks what waits by what it waits for, in the order of the answer', async () => {
  desk(() => ({
    review: [row('Gear bracket', { state: 'underReview' })],
    firstFix: [row('Longeron edge'), row('One shop head squashed')],
    stamp: [row('Hole 7', { state: 'advised' })],
  }));
  renderRoute('/desk', { me: mentor });
  await screen.findByRole('list', { name: 'No fix yet' });
  expect(titlesIn('To be looked at again')).toEqual(['Gear bracket']);
  expect(titlesIn('No fix yet')).toEqual(['Longeron edge', 'One shop head squashed']);
  expect(titlesIn('Wait for a stamp')).toEqual(['Hole 7']);
  expect(screen.getByText('Your disciplines: sheet metal, riveting.')).toBeInTheDocument();
});

it('takes what somebody else has done off the desk', async () => {
  const fake = fakeLive();
  const first = row('Hole 7');
  let now: Desk = { ...EMPTY, firstFix: [first, row('Longeron edge')] };
  desk(() => now);
  renderRoute('/desk', { me: mentor });
  await screen.findByText('Hole 7');
  now = { ...EMPTY, firstFix: [row('Longeron edge')] };
  fake.say('question.changed', { questionId: first.id, sectionId: null, chapterId: first.chapterId });
  await waitFor(() => expect(screen.queryByText('Hole 7')).not.toBeInTheDocument());
  expect(titlesIn('No fix yet')).toEqual(['Longeron edge']);
});

it('says so when nothing waits', async () => {
  desk(() => EMPTY);
  renderRoute('/desk', { me: mentor });
  expect(await screen.findByText('Nothing waits for you.')).toBeInTheDocument();
});

it('says what a mentor without a discipline lacks', async () => {
  desk(() => EMPTY);
  const memberships = [{ ...membership!, roles: ['mentor' as const], disciplines: [] }];
  renderRoute('/desk', { me: makeMe({ memberships }) });
  expect(await screen.findByText(/You mentor in no discipline yet/)).toBeInTheDocument();
});

it.each([
  ['a builder', makeMe()],
  ['a suspended mentor', makeMe({ memberships: [{ ...mentor.memberships[0]!, status: 'suspended' }] })],
])('is not open to %s, and asks the server nothing', async (_, me) => {
  const asked = desk(() => EMPTY);
  renderRoute('/desk', { me });
  expect(await screen.findByText(/not open to you/)).toBeInTheDocument();
  expect(asked()).toBe(0);
});

it('says why it did not come, and tries again', async () => {
  let isDown = true;
  desk(() => (isDown ? HttpResponse.error() : EMPTY));
  const { user } = renderRoute('/desk', { me: mentor });
  expect(await screen.findByRole('alert', {}, { timeout: 5000 })).toHaveTextContent('There is no network.');
  isDown = false;
  await user.click(screen.getByRole('button', { name: 'Try again' }));
  expect(await screen.findByText('Nothing waits for you.')).toBeInTheDocument();
});

import type { SearchHit } from '@rivetside/shared';
import { addressOfHit, groupHits } from './group-hits';

const hit = (facts: Partial<SearchHit>): SearchHit => ({
  kind: 'question',
  id: 'a',
  sectionId: null,
  title: [],
  place: '',
  excerpt: [],
  state: null,
  standing: null,
  ...facts,
});

it('puts the group of the best hit first and keeps the order within each', () => {
  const hits = [
    hit({ kind: 'part', id: '1' }),
    hit({ kind: 'question', id: '2' }),
    hit({ kind: 'part', id: '3' }),
  ];
  expect(groupHits(hits).map(({ kind, hits: those }) => [kind, those.map(({ id }) => id)])).toEqual([
    ['part', ['1', '3']],
    ['question', ['2']],
  ]);
});

it.each([
  [hit({ kind: 'question', id: 'q' }), '/questions/q'],
  [hit({ kind: 'section', id: 's', sectionId: 's' }), '/sections/s'],
  [hit({ kind: 'part', id: 'p', sectionId: 's' }), '/sections/s'],
  [hit({ kind: 'notice', id: 'n' }), null],
])('leads where the hit can be read', (one, address) => expect(addressOfHit(one)).toBe(address));

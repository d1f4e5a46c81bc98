import { makeMe } from '../../testing/make-me';
import { makeQuestionRow } from '../../testing/make-question-row';
import { disciplinesOf, needsMost } from './desk-words';

const [membership] = makeMe().memberships;
const mentoring = (facts: object) => ({ ...membership!, roles: ['mentor' as const], ...facts });

it('names the disciplines somebody advises in once, in the order of the trade', () => {
  const memberships = [
    mentoring({ disciplines: ['riveting', 'sheetMetal'] }),
    mentoring({ disciplines: ['riveting', 'engine'] }),
    mentoring({ disciplines: ['sealant'], status: 'suspended' }),
    mentoring({ disciplines: ['controls'], roles: ['builder'] }),
  ];
  expect(disciplinesOf({ memberships })).toEqual(['sheet metal', 'riveting', 'engine and firewall forward']);
});

it('puts ground that moved first, then what nobody has answered, and cuts at the count', () => {
  const row = (id: string) => makeQuestionRow({ id });
  const desk = { firstFix: [row('b'), row('c')], stamp: [row('d')], review: [row('a')] };
  expect(needsMost(desk, 3).map(({ id }) => id)).toEqual(['a', 'b', 'c']);
});
